'use client';

export default function ErrorPage({ error, retry }: { error: Error & { digest?: string }; retry: () => void }) {
  return (
    <div className="max-w-xl pt-16">
      <h1 className="text-3xl">This page could not be shown</h1>
      <p className="mt-4 font-serif text-lg">
        Something went wrong on our side. What you entered is still in the address of this page.
      </p>
      {error.digest && <p className="mt-2 text-muted">The log knows it as {error.digest}.</p>}
      <button type="button" onClick={() => retry()} className="mt-6 rounded-md bg-ink px-4 py-2 font-medium text-paper">
        Try again
      </button>
    </div>
  );
}
