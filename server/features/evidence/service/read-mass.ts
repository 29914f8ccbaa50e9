import { parseMeasured } from '#shared/numeric/units/parse-measured.ts';
import { Problem } from '../../../http/problem.ts';

/** The columns of a mass from its typing. @throws Problem not-valid with the reason, at the field `mass` */
export function readMass(typed: string | null) {
  if (typed === null) return { massG: null, massUncertaintyG: null, massEntered: null };
  const read = parseMeasured(typed, { kind: 'mass', openUnit: true });
  if (read.kind === 'refused') throw notValid(read.reason);
  if (read.value <= 0) throw notValid(`A piece weighs more than nothing, and ${typed} was typed.`);
  return { massG: read.value, massUncertaintyG: read.expandedUncertainty, massEntered: read.typed.text };
}

function notValid(reason: string): Problem {
  return new Problem('not-valid', reason, { field: 'mass', fields: { mass: reason } });
}
