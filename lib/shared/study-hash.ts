import canonicalize from 'canonicalize';
import { parseStudy } from '@/kernels/study/parse-study';

/**
 * What identifies a study: SHA-256 (hexadecimal) over its canonical JSON (RFC 8785, Rundgren, Jordan and Erdtman, JSON
 * Canonicalization Scheme, 2020) with every default written out, title and notes left out. Two files that ask for the
 * same computation have the same hash, whatever they leave to the defaults. Throws a RangeError for a study with faults.
 */
export async function studyHash(study: unknown): Promise<string> {
  const digest = await crypto.subtle.digest('SHA-256', new TextEncoder().encode(canonicalStudy(study)));
  return [...new Uint8Array(digest)].map((byte) => byte.toString(16).padStart(2, '0')).join('');
}

/** The text that is hashed. */
export function canonicalStudy(study: unknown): string {
  const parsed = parseStudy(study);
  if (parsed.study === undefined) {
    const [{ path, message }] = parsed.faults;
    throw new RangeError(`${path}: ${message}`);
  }
  const { title: _title, notes: _notes, ...computed } = parsed.study;
  return canonicalize(computed) as string;
}
