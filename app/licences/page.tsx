import type { Metadata } from 'next';
import { fontNotices } from '@/lib/server/font-notices';

export const metadata: Metadata = { title: 'Licences' };

export default function LicencesPage() {
  return (
    <article className="max-w-3xl pt-10">
      <h1 className="text-3xl">Licences</h1>
      <p className="mt-4 font-serif text-lg leading-relaxed">
        Smirr is published under the Apache License, version 2.0; its full text lies in the file LICENSE of the source.
        The fonts below come with it, each under the SIL Open Font License 1.1, unchanged.
      </p>
      {fontNotices().map(({ name, use, text }) => (
        <section key={name} className="mt-8 border-t border-rule pt-4">
          <h2 className="text-xl">{name}</h2>
          <p className="text-muted">For {use}.</p>
          <details className="mt-2">
            <summary className="w-fit underline underline-offset-2">The licence in full</summary>
            <p className="mt-3 whitespace-pre-wrap break-words text-[0.8125rem]">{text}</p>
          </details>
        </section>
      ))}
    </article>
  );
}
