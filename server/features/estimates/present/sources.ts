import type { InputView, SourceNode } from '#shared/contracts/estimates.ts';
import { constantKindTable } from '#shared/vocabulary/constant-kinds.ts';
import { formatShortDay } from '#shared/wording/dates.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import type { ConstantSource, ReadingSource } from '../queries/inputs.ts';
import type { InputSourcesFound, StaleIds } from './inputs.ts';

type About = { readonly caseNumber: string; readonly found: InputSourcesFound; readonly stale: StaleIds };

/** Where an estimate comes from, in words: one branch an input, down to the calibration or the source of a constant. */
export function presentSources(inputs: readonly InputView[], about: About): SourceNode[] {
  return inputs.map((input) => {
    const { source } = input;
    const words = `${lowerFirst(input.label)} ${input.symbol}, ${input.text}`;
    const node = { words, stale: input.stale };
    if (source.kind === 'measurement') {
      const reading = about.found.readings.get(source.measurementId);
      const from = reading ? readingNodes(reading, about) : [];
      return { ...node, kind: 'measurement', id: source.measurementId, href: null, from };
    }
    if (source.kind === 'material constant') {
      const constant = about.found.constants.get(source.constantId);
      const from = constant ? [constantNode(constant, about)] : [];
      return { ...node, kind: 'typed', id: null, href: null, from };
    }
    return { ...node, kind: 'typed', id: null, href: null, from: noteNodes(source.note) };
  });
}

function readingNodes(reading: ReadingSource, { caseNumber, stale }: About): SourceNode[] {
  const href = `/cases/${caseNumber}/fractographs/${reading.fractographId}`;
  const calibration: SourceNode = {
    kind: 'calibration',
    id: reading.calibrationId,
    words: `${reading.calibrationCode ?? reading.calibrationSource}, ${reading.calibratedBy}, ${formatShortDay(reading.validFrom)}`,
    stale: stale.has(reading.calibrationId),
    href: null,
    from: [],
  };
  const scale: SourceNode = {
    kind: 'calibration binding',
    id: reading.bindingId,
    words: `Fig. ${reading.figureNumber}, ${formatNumber(reading.pixelSizeXUm, { significantFigures: 4 })} µm/px`,
    stale: stale.has(reading.bindingId),
    href,
    from: [calibration],
  };
  const mark: SourceNode = {
    kind: 'mark version',
    id: reading.markVersionId,
    words: `mark m${reading.markNumber}, ${reading.markedBy}, ${formatShortDay(reading.markedAt.toISOString())}`,
    stale: stale.has(reading.markVersionId),
    href,
    from: [scale],
  };
  if (reading.originVersionId === null) return [mark];
  const origin: SourceNode = {
    kind: 'mark version',
    id: reading.originVersionId,
    words: `from the origin, m${reading.originNumber ?? ''}`,
    stale: stale.has(reading.originVersionId),
    href,
    from: [],
  };
  return [mark, origin];
}

function constantNode(constant: ConstantSource, { stale }: About): SourceNode {
  const word = constantKindTable[constant.kind].word;
  return {
    kind: 'material constant',
    id: constant.id,
    words: `${word}, record ${constant.recordNumber} of ${constant.materialName}`,
    stale: stale.has(constant.id),
    href: `/materials/${constant.materialId}`,
    from: noteNodes(`${constant.sourceStanding}: ${constant.source}`),
  };
}

function noteNodes(note: string): SourceNode[] {
  return note === '' ? [] : [{ kind: 'typed', id: null, words: note, stale: false, href: null, from: [] }];
}

const lowerFirst = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);
