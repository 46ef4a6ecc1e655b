import type { Metadata } from 'next';
import Link from 'next/link';

export const metadata: Metadata = { title: 'No such page' };

export default function NotFound() {
  return (
    <div className="max-w-xl pt-16">
      <h1 className="text-3xl">There is no page at this address</h1>
      <p className="mt-4 font-serif text-lg">
        It may have been moved or mistyped. The bench is at{' '}
        <Link href="/explore" className="underline underline-offset-2">
          Explore
        </Link>
        .
      </p>
    </div>
  );
}
