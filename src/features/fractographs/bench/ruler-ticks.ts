import type { ReadingScale } from '#shared/rules/mark-readings.ts';
import { formatNumber } from '#shared/wording/quantity.ts';
import { toImage, toScreen, type StageSize, type View } from './view.ts';

export type Tick = { readonly xScreenPx: number; readonly label: string | null; readonly isZero: boolean };

const leastApartScreenPx = 64;
const smallTicksPerStep = 5;

/** 1, 2 or 5 times a power of ten, at least `least`. */
export function roundStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  const times = [1, 2, 5, 10].find((each) => each * power >= least * (1 - 1e-9)) ?? 10;
  return times * power;
}

/** The unit of a ruler or bar: µm, or mm from a step of 1 mm on; px of the image while it is uncalibrated. */
export function rulerUnit(scale: ReadingScale | null, step: number): { unit: string; perUnit: number } {
  if (!scale) return { unit: 'px', perUnit: 1 };
  return step >= 1000 ? { unit: 'mm', perUnit: 1000 } : { unit: 'µm', perUnit: 1 };
}

/** Ticks along the foot of a face, with zero at `zeroXPx` of the image and lengths counted both ways from it. */
export function rulerTicks(
  face: { view: View; stage: StageSize; scale: ReadingScale | null },
  zero: { xPx: number; name: string },
): readonly Tick[] {
  const { view, stage, scale } = face;
  const perPx = scale ? scale.pixelSizeXUm : 1;
  const step = roundStep((leastApartScreenPx / view.screenPxPerImagePx) * perPx);
  const { unit, perUnit } = rulerUnit(scale, step);
  const small = step / smallTicksPerStep / perPx;
  const ends = [0, stage.widthScreenPx].map((x) => toImage(view, stage, { x, y: 0 }).x);
  const [first, last] = [Math.min(...ends), Math.max(...ends)].map((xPx) => (xPx - zero.xPx) / small);
  const ticks: Tick[] = [];
  for (let count = Math.ceil(first); count <= last; count += 1) {
    const xScreenPx = toScreen(view, stage, { x: zero.xPx + count * small, y: 0 }).x;
    const isStep = count % smallTicksPerStep === 0;
    const value = Math.abs((count / smallTicksPerStep) * step) / perUnit;
    const label = count === 0 ? `0${'\u00a0'}${unit}${zero.name}` : formatNumber(value);
    ticks.push({ xScreenPx, label: isStep ? label : null, isZero: count === 0 });
  }
  return ticks;
}

/** A bar of round length, at most `mostScreenPx` long, with its words. */
export function scaleBarOf(
  view: View,
  scale: ReadingScale | null,
  mostScreenPx: number,
): { widthScreenPx: number; words: string } {
  const perPx = scale ? scale.pixelSizeXUm : 1;
  const most = (mostScreenPx / view.screenPxPerImagePx) * perPx;
  // the round length below: a fifth to all of the room is filled
  const length =
    [5, 2, 1].map((times) => times * 10 ** Math.floor(Math.log10(most))).find((each) => each <= most) ?? most;
  const { unit, perUnit } = rulerUnit(scale, length);
  const words = `${formatNumber(length / perUnit)}${'\u00a0'}${unit}${scale ? '' : ', uncalibrated'}`;
  return { widthScreenPx: (length / perPx) * view.screenPxPerImagePx, words };
}
