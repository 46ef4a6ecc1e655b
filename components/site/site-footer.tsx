import Link from 'next/link';

export function SiteFooter() {
  return (
    <footer className="mt-12 border-t border-rule">
      <div className="mx-auto flex w-full max-w-[1400px] flex-wrap gap-x-6 gap-y-1 px-4 py-5 text-[0.8125rem] text-muted sm:px-7">
        <span>Smirr, under the Apache License 2.0</span>
        <Link href="/licences" className="underline underline-offset-2 hover:text-ink">
          Licences
        </Link>
      </div>
    </footer>
  );
}
