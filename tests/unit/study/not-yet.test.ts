import { describe, expect, it } from 'vitest';
import { studySchema } from '@/kernels/spec';
import { parseStudy } from '@/kernels/study/parse-study';
import notComputedYet from '../../fixtures/studies/not-computed-yet.json' with { type: 'json' };

describe('what the study file has and this version does not compute', () => {
  it.each(notComputedYet.map((row) => [row.what, row] as const))(
    '%s: accepted by the schema, refused in words',
    (_, row) => {
      expect(studySchema.safeParse(row.study).error?.issues ?? []).toEqual([]);
      const { study, faults } = parseStudy(row.study);
      expect(study).toBeUndefined();
      const fault = faults?.find((f) => f.path === row.path);
      expect(fault, JSON.stringify(faults)).toBeDefined();
      expect(fault?.message).toMatch(/not computed yet; allowed now: /);
    },
  );
});
