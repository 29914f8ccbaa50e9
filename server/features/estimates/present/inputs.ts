import { FractographId } from '#shared/contracts/ids.ts';
import type { InputSourceView, InputView } from '#shared/contracts/estimates.ts';
import type { Method } from '#shared/numeric/methods/method.ts';
import type { OurUnit } from '#shared/numeric/units/our-units.ts';
import { inputText } from '#shared/wording/input-quantity.ts';
import type { ConstantSource, InputRow, ReadingSource } from '../queries/inputs.ts';

/** What the inputs of the estimates of a case were read from, by the id of the record. */
export type InputSourcesFound = {
  readonly readings: ReadonlyMap<string, ReadingSource>;
  readonly constants: ReadonlyMap<string, ConstantSource>;
};

/** Records that hold no longer, so that what was read from them shows as stale. */
export type StaleIds = ReadonlySet<string>;

export function presentInput(method: Method, row: InputRow, found: InputSourcesFound, stale: StaleIds): InputView {
  const described = method.inputs.find((input) => input.name === row.name);
  const unit = unitOf(method, row.name);
  const { name, value, standardUncertainty, distribution, enteredText, enteredUnit, enteredUncertainty } = row;
  return {
    name,
    label: described?.label ?? name,
    symbol: described && described.kind !== 'code' ? described.symbol : name,
    value,
    standardUncertainty,
    unit,
    distribution,
    text: inputText({ value, standardUncertainty, unit }),
    enteredText,
    enteredUnit,
    enteredUncertainty,
    boundary: row.boundary,
    source: presentSource(row, found),
    stale: recordsBehind(row, found).some((id) => stale.has(id)),
  };
}

/** The unit of a method's input. @throws Error for an input the method does not have */
export function unitOf(method: Method, name: string): OurUnit {
  const input = method.inputs.find((each) => each.name === name);
  if (!input || input.kind === 'code') throw new Error(`${method.id} has no number called ${name}`);
  return input.unit;
}

function presentSource(row: InputRow, found: InputSourcesFound): InputSourceView {
  const reading = found.readings.get(row.sourceId ?? '');
  if (reading) {
    const { id, markId, markNumber, quantity, fractographId, figureNumber, markedBy, markedAt, calibrationId } =
      reading;
    return {
      kind: 'measurement',
      measurementId: id,
      markId,
      markNumber,
      quantity,
      fractographId: FractographId.parse(fractographId),
      figureNumber,
      readBy: markedBy,
      readAt: markedAt.toISOString(),
      calibrationId,
    };
  }
  const constant = found.constants.get(row.sourceId ?? '');
  if (constant) {
    const { id, kind, recordNumber, materialId, materialName, source, sourceStanding } = constant;
    return {
      kind: 'material constant',
      constantId: id,
      constantKind: kind,
      recordNumber,
      materialId,
      materialName,
      source,
      sourceStanding,
    };
  }
  return { kind: 'typed', note: row.sourceNote };
}

/** Every record the input rests on, so that a replaced one shows at the input. */
function recordsBehind(row: InputRow, found: InputSourcesFound): string[] {
  const reading = found.readings.get(row.sourceId ?? '');
  if (!reading) return row.sourceId === null ? [] : [row.sourceId];
  const { id, markVersionId, originVersionId, bindingId, calibrationId } = reading;
  return [id, markVersionId, bindingId, calibrationId, ...(originVersionId === null ? [] : [originVersionId])];
}
