import { describe, expect, it } from 'vitest';
import { catalogueEntries } from '@/lib/shared/catalogue';
import { findSystems } from '@/lib/shared/find-systems';

const catalogue = catalogueEntries();
const ids = (typed: string) => findSystems(catalogue, typed).map(({ id }) => id);

describe('the search in the catalogue', () => {
  it('finds all for nothing, and each system by its own title', () => {
    expect(ids('  ')).toHaveLength(catalogue.length);
    for (const { id, title } of catalogue) expect(ids(title.toUpperCase())).toContain(id);
  });

  it('wants every word, in any order, in any of title, group, summary, formula, source', () => {
    expect(ids('tent textbook')).toEqual(ids('textbook tent'));
    expect(ids('min(x')).toContain('tent');
    expect(ids('gaspard')).toContain('tent');
    expect(ids('tent nonsense')).toEqual([]);
  });

  it('reads accents as plain letters', () => {
    expect(ids('pomeaü')).toEqual(ids('pomeau'));
    expect(ids('pomeau').length).toBeGreaterThan(0);
  });
});

describe('what is known of a system', () => {
  it('has a value and a source for everything, in words a page can show', () => {
    const known = catalogue.flatMap((entry) => entry.known);
    expect(known.length).toBeGreaterThan(catalogue.length);
    for (const { quantity, value, source } of known)
      for (const words of [quantity, value, source]) expect(words).toMatch(/\S/);
    const tent = catalogue.find(({ id }) => id === 'tent')?.known;
    // ln 2, from any table of constants (from memory).
    expect(tent).toContainEqual(
      expect.objectContaining({ quantity: 'Lyapunov exponent', holdsFor: 's = 2', value: '0.693147180559945' }),
    );
  });
});
