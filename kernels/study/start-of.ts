import { compileFormula } from '../formula/compile-formula';
import { findBreaks } from '../formula/find-breaks';
import { parseFormula } from '../formula/parse-formula';
import type { PanelGrid } from '../grid/panels';
import { gaussianCuts, pointSource, type StartSources, sampleSources, smoothSources } from '../grid/start-sources';
import type { Boundary } from '../operators/ends';
import { imagesOf } from '../operators/ends';
import type { StartDensity, Study } from '../spec';
import { StudyRefused } from './study-refused';

/**
 * The start density of a study as masses and values, of integral 1 on the domain: a Gaussian is folded by periodic and
 * reflecting ends and cut (and normalised) at absorbing ones; a formula is normalised.
 *
 * @param path where it stands in the study, for the message
 * @param parameters values by name
 * @param base grid that resolves the step
 * @throws StudyRefused where a formula is negative, not a number or without mass in the domain
 */
export function startOf(
  start: StartDensity,
  path: string,
  study: Study,
  parameters: Readonly<Record<string, number>>,
  boundary: Boundary,
  base: PanelGrid,
): StartSources {
  const { from, to } = boundary;
  switch (start.kind) {
    case 'point':
      return pointSource(start.at[0]);
    case 'samples':
      return sampleSources(start.samples.map((s) => (typeof s === 'number' ? s : s[0])));
    case 'uniform':
      return smoothSources(base, [], (x) => new Float64Array(x.length).fill(1 / (to - from)));
    case 'gaussian': {
      const [mean] = start.mean;
      const [sd] = start.sd;
      const images = imagesOf(boundary, 9 * sd);
      return smoothSources(base, gaussianCuts(mean, sd, from, to), (x) =>
        x.map(
          (v) =>
            images.reduce((s, { sign, shift }) => s + Math.exp(-0.5 * ((sign * v + shift - mean) / sd) ** 2), 0) /
            (sd * Math.sqrt(2 * Math.PI)),
        ),
      );
    }
    case 'formula': {
      const names = Object.keys(study.system.parameters);
      const scope = { variables: study.system.variables ?? ['x'], parameters: names };
      const values = names.map((n) => parameters[n]);
      const tree = parseFormula(start.formula, scope);
      const compiled = compileFormula(tree, scope);
      try {
        return smoothSources(base, findBreaks(tree, scope, values, from, to).at, (x) => {
          const out = new Float64Array(x.length);
          compiled.evaluate([x], values, out);
          return out;
        });
      } catch (error) {
        if (error instanceof RangeError) throw new StudyRefused(`${path}.formula`, error.message);
        throw error;
      }
    }
  }
}
