import { SYSTEMS } from '@/kernels/systems';
import { ALL_DIGITS, formatEntry } from './format-number';
import type { SystemEntry } from './system-entry';
import { typesetFormula } from './typeset-study';

/** The catalogue as plain data, for pages: the functions stay where the computing is done. */
export function catalogueEntries(): SystemEntry[] {
  return SYSTEMS.map(
    ({ id, title, group, summary, citation, known, variables, formulas, parameters, domain, sigma }) => ({
      id,
      title,
      group,
      summary,
      citation,
      variable: variables[0],
      formula: formulas[0],
      typeset: typesetFormula(
        formulas[0],
        variables,
        parameters.map(({ name }) => name),
      ),
      parameters: parameters.map(({ name, title: meaning, unit, range: [min, max], default: usual }) => ({
        name,
        title: meaning,
        unit,
        min,
        max,
        default: usual,
      })),
      domain: domain[0],
      sigma: sigma.default,
      known: known.map(({ quantity, parameters: at, value, source }) => ({
        quantity,
        holdsFor: Object.entries(at)
          .map(([name, number]) => `${name} = ${number}`)
          .join(', '),
        value: typeof value === 'number' ? formatEntry(Number(value.toPrecision(ALL_DIGITS))) : value,
        source,
      })),
    }),
  );
}
