import type { SystemEntry } from './system-entry';

/** Systems in which every typed word occurs: in title, group, summary, formula, citation or a parameter's meaning. */
export function findSystems(catalogue: SystemEntry[], typed: string): SystemEntry[] {
  const words = plain(typed).split(/\s+/).filter(Boolean);
  return catalogue.filter((entry) => {
    const { id, title, group, summary, formula, citation, parameters } = entry;
    const meanings = parameters.map(({ title: meaning }) => meaning);
    const text = plain([id, title, group, summary, formula, citation, ...meanings].join(' '));
    return words.every((word) => text.includes(word));
  });
}

function plain(text: string): string {
  return text.toLowerCase().normalize('NFKD').replace(/\p{M}/gu, '');
}
