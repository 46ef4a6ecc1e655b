import Link from 'next/link';
import { Mark } from './mark';
import { SiteNav } from './site-nav';
import { ThemeButton } from './theme-button';

export function SiteHeader() {
  return (
    <header className="border-b border-rule">
      <div className="mx-auto flex h-[52px] w-full max-w-[1400px] items-center gap-6 px-4 sm:px-7">
        <Link href="/" className="flex items-center gap-2 font-serif text-[1.375rem] font-semibold leading-none">
          <Mark className="size-[22px]" />
          smirr
        </Link>
        <SiteNav />
        <div className="ml-auto">
          <ThemeButton />
        </div>
      </div>
    </header>
  );
}
