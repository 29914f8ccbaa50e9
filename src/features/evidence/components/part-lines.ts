import type { PartView } from '#shared/contracts/evidence.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import type { VersionLine } from './both-versions.tsx';
import type { PartTyped } from './typed-temperature.ts';

/** A part as its form holds it; empty where there is none yet. */
export function typedPart(part: PartView | null): PartTyped {
  return {
    description: part?.description ?? '',
    serial: part?.serial ?? '',
    drawing: part?.drawing ?? '',
    maker: part?.maker ?? '',
    materialId: part?.material?.id ?? '',
    environment: part?.environment ?? '',
    temperatureC: typeof part?.temperatureC === 'number' ? String(part.temperatureC) : '',
    serviceTime: part?.serviceTime ?? '',
  };
}

/** Two versions of a part, line by line. */
export function linesOfPart(
  theirs: PartTyped,
  mine: PartTyped,
  materials: readonly { id: string; name: string }[],
): VersionLine[] {
  const line = (word: string, read: (typed: PartTyped) => string | null) => ({
    word,
    theirs: read(theirs),
    mine: read(mine),
  });
  return [
    line('What it is', (typed) => typed.description),
    line('Serial', (typed) => typed.serial),
    line('Drawing', (typed) => typed.drawing),
    line('Maker', (typed) => typed.maker),
    line('Material', ({ materialId }) => materials.find(({ id }) => id === materialId)?.name ?? null),
    line('Environment', (typed) => typed.environment),
    line('Temperature', ({ temperatureC }) => (temperatureC === '' ? null : `${temperatureC} °C`)),
    line('Service time', (typed) => typed.serviceTime),
  ];
}

/** What is known of a part, as words and values, without what is not. */
export function factsOfPart(part: PartView): { word: string; value: string }[] {
  const temperature = part.temperatureC === null ? null : `${formatNumber(part.temperatureC)}\u00A0°C`;
  const facts = [
    ['Serial', part.serial],
    ['Drawing', part.drawing],
    ['Maker', part.maker],
    ['Material', part.material?.name ?? null],
    ['Environment', part.environment],
    ['Temperature', temperature],
    ['Service time', part.serviceTime],
  ] as const;
  return facts.flatMap(([word, value]) => (value === null ? [] : [{ word, value }]));
}
