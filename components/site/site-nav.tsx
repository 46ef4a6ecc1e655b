'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';

const pages = [{ href: '/explore', label: 'Explore' }] as const;

export function SiteNav() {
  const path = usePathname();
  return (
    <nav aria-label="Main" className="flex self-stretch">
      {pages.map(({ href, label }) => {
        const here = path.startsWith(href);
        return (
          <Link
            key={href}
            href={href}
            aria-current={here ? 'page' : undefined}
            className={`flex items-center border-b-2 px-1 font-medium ${here ? 'border-rain text-ink' : 'border-transparent text-muted hover:text-ink'}`}
          >
            {label}
          </Link>
        );
      })}
    </nav>
  );
}
