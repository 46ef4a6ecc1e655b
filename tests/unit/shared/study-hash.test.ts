import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';
import { describe, expect, it } from 'vitest';
import { parseStudy } from '@/kernels/study/parse-study';
import { FIRST_STUDY } from '@/lib/shared/bench-study';
import { canonicalStudy, studyHash } from '@/lib/shared/study-hash';

describe('canonical JSON', () => {
  // RFC 8785, section 3.2.2 (input and its serialisation).
  it('writes the sample of RFC 8785 as the RFC does', () => {
    const sample = String.raw`{
      "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
      "string": "\u20ac$\u000F\u000aA'\u0042\u0022\u005c\\\"\/",
      "literals": [null, true, false]
    }`;
    expect(canonicalize(JSON.parse(sample))).toBe(
      String.raw`{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\u000f\nA'B\"\\\\\"/"}`,
    );
  });

  // RFC 8785, section 3.2.3.
  it('sorts names by UTF-16 code units', () => {
    const sample = String.raw`{"\u20ac":"Euro Sign","\r":"Carriage Return","\ufb33":"Hebrew Letter Dalet With Dagesh",
      "1":"One","\ud83d\ude00":"Emoji: Grinning Face","\u0080":"Control","\u00f6":"Latin Small Letter O With Diaeresis"}`;
    const sorted = Object.values(JSON.parse(canonicalize(JSON.parse(sample)) ?? ''));
    // The integer-like name is moved to the front by the reader, not by the writer: it is looked for in the text.
    expect(canonicalize(JSON.parse(sample))).toMatch(
      /Carriage Return.*One.*Control.*Latin Small.*Euro Sign.*Emoji.*Hebrew/s,
    );
    expect(sorted).toHaveLength(7);
  });

  // RFC 8785, appendix B: IEEE 754 bits and their text.
  it.each([
    ['0000000000000000', '0'],
    ['8000000000000000', '0'],
    ['0000000000000001', '5e-324'],
    ['7fefffffffffffff', '1.7976931348623157e+308'],
    ['4340000000000000', '9007199254740992'],
    ['44b52d02c7e14af6', '1e+23'],
    ['444b1ae4d6e2ef4f', '999999999999999900000'],
    ['444b1ae4d6e2ef50', '1e+21'],
    ['3eb0c6f7a0b5ed8c', '9.999999999999997e-7'],
    ['3eb0c6f7a0b5ed8d', '0.000001'],
    ['41b3de4355555555', '333333333.3333333'],
    ['becbf647612f3696', '-0.0000033333333333333333'],
  ])('writes the number %s as %s', (bits, text) => {
    expect(canonicalize(Buffer.from(bits, 'hex').readDoubleBE())).toBe(text);
  });
});

describe('the hash of a study', () => {
  it('is SHA-256 of the canonical study', async () => {
    const text = canonicalStudy(FIRST_STUDY);
    expect(text).toMatch(/^\{"ask":\{"exit":\{"start":\{"kind":"uniform"\}\}/);
    expect(text).not.toContain('"title"');
    expect(await studyHash(FIRST_STUDY)).toBe(createHash('sha256').update(text).digest('hex'));
  });

  it('does not see title, notes, the order of names or written-out defaults', async () => {
    const hash = await studyHash(FIRST_STUDY);
    const { study } = parseStudy(FIRST_STUDY);
    expect(await studyHash(study)).toBe(hash);
    expect(await studyHash({ ...FIRST_STUDY, title: 'Another', notes: 'Words' })).toBe(hash);
    expect(await studyHash(Object.fromEntries(Object.entries(FIRST_STUDY).reverse()))).toBe(hash);
  });

  it('sees everything that is computed', async () => {
    const others = [
      FIRST_STUDY,
      { ...FIRST_STUDY, noise: { kind: 'gaussian', sigma: 0.0121 } },
      { ...FIRST_STUDY, system: { ...FIRST_STUDY.system, parameters: { r: 3.81 } } },
      { ...FIRST_STUDY, domain: [{ from: 0, to: 1, ends: 'reflecting' }] },
      { ...FIRST_STUDY, grid: { points: 512 } },
      { ...FIRST_STUDY, ask: { stationary: {} } },
    ];
    expect(new Set(await Promise.all(others.map(studyHash))).size).toBe(others.length);
  });

  it('refuses a study with faults', async () => {
    await expect(studyHash({ ...FIRST_STUDY, domain: [] })).rejects.toThrow(RangeError);
  });
});
