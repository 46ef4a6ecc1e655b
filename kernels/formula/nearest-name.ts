/**
 * The known name that a mistyped one most likely means: the smallest number of inserted, dropped, changed or swapped
 * neighbouring letters (optimal string alignment; Damerau 1964), capital letters counting as small ones.
 * @param name what was written; longer than 40 characters has no nearest name
 * @param known the names to choose from
 * @returns a known name at most two steps away (one for names of up to three letters), else null.
 *   Cost: length of `name` times the summed length of `known`.
 */
export function nearestName(name: string, known: readonly string[]): string | null {
  if (name.length > 40) return null;
  let best: string | null = null;
  let least = name.length <= 3 ? 1.5 : 2.5;
  for (const candidate of known) {
    // Of two equally near names the one with the longer common beginning: sinn is rather sin than sign.
    const steps = distance(name.toLowerCase(), candidate.toLowerCase()) - commonStart(name, candidate) / 1000;
    if (steps < least && Math.ceil(steps) < Math.max(name.length, candidate.length)) {
      least = steps;
      best = candidate;
    }
  }
  return best;
}

function commonStart(a: string, b: string): number {
  let k = 0;
  while (k < a.length && k < b.length && a[k] === b[k]) k++;
  return k;
}

function distance(a: string, b: string): number {
  let beforeLast: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const change = a[i - 1] === b[j - 1] ? 0 : 1;
      let steps = Math.min(last[j] + 1, row[j - 1] + 1, last[j - 1] + change);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1])
        steps = Math.min(steps, beforeLast[j - 2] + 1);
      row.push(steps);
    }
    beforeLast = last;
    last = row;
  }
  return last[b.length];
}
