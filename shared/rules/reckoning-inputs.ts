import type { ReckoningInput, ReckoningWanted } from '../contracts/reckonings.ts';
import type { GivenInputs, Method, MethodInput } from '../numeric/methods/method.ts';
import { OutsideDomain } from '../numeric/outside-domain.ts';
import { findUnit } from '../numeric/units/unit-table.ts';

type Listed = ReckoningWanted['inputs'];

// A wide section, as the reference values write it: the input is left out.
const endless = 'infinite';

/**
 * Listed inputs as the method takes them, in our units, each with the uncertainty that is listed beside it.
 * @throws OutsideDomain unknown-unit
 */
export function givenFromListed(method: Method, listed: Listed): GivenInputs {
  const entries = Object.entries(listed);
  const uncertainties = new Set(entries.map(([name]) => uncertaintyName(method, listed, name)));
  return Object.fromEntries(
    entries
      .filter(([name, { value }]) => !uncertainties.has(name) && value !== endless)
      .map(([name, entry]) => [name, givenFrom(method, listed, name, entry)]),
  );
}

/** u_load, uA or uStress; none where the method has an input of that name itself. */
function uncertaintyName(method: Method, listed: Listed, name: string): string | undefined {
  const capitalised = `${name.charAt(0).toUpperCase()}${name.slice(1)}`;
  return [`u_${name}`, `u${name}`, `u${capitalised}`].find(
    (spelled) => spelled in listed && !method.inputs.some((input) => input.name === spelled),
  );
}

function givenFrom(method: Method, listed: Listed, name: string, entry: ReckoningInput): GivenInputs[string] {
  const input = method.inputs.find((each) => each.name === name);
  const { value } = entry;
  if (typeof value === 'string') return { code: value };
  const factor = factorOf(input, name, entry);
  if (Array.isArray(value)) return { values: value.map((each) => (each ?? Number.NaN) * factor) };
  const spelled = uncertaintyName(method, listed, name);
  const uncertainty = spelled === undefined ? undefined : listed[spelled];
  if (spelled === undefined || !uncertainty) return { value: (value ?? Number.NaN) * factor };
  const standard = typeof uncertainty.value === 'number' ? uncertainty.value : Number.NaN;
  const standardUncertainty = standard * factorOf(input, spelled, uncertainty);
  return { value: (value ?? Number.NaN) * factor, standardUncertainty };
}

/** How many of our unit the listed one is; 1 for an input that the method will refuse as unknown. */
function factorOf(input: MethodInput | undefined, name: string, { unit }: ReckoningInput): number {
  if (!input || input.kind === 'code') return 1;
  const found = findUnit(unit, input.unitKind);
  if (found?.kind !== input.unitKind) throw new OutsideDomain('unknown-unit', name);
  return found.factor;
}
