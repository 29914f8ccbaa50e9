/** A linear axis of stress: where it begins and ends, MPa, and what it marks. */
export type StressAxis = { from: number; to: number; major: number[]; minor: number[] };

const niceSteps = [1, 2, 4, 5, 10];

/** The smallest of 1, 2, 4, 5 times a power of ten that is not below `rough`. */
function niceStep(rough: number): number {
  const power = 10 ** Math.floor(Math.log10(rough));
  return (niceSteps.find((step) => step * power >= rough) ?? 10) * power;
}

function multiples(step: number, from: number, to: number): number[] {
  const count = Math.round((to - from) / step);
  return Array.from({ length: count + 1 }, (_, index) => from + index * step);
}

/** An axis that holds all the given stresses, MPa, in about three steps; refuses none, and widens a single one. */
export function stressAxis(stressesMPa: readonly number[]): StressAxis {
  const least = stressesMPa.length === 0 ? 0 : Math.min(...stressesMPa);
  const most = stressesMPa.length === 0 ? 100 : Math.max(...stressesMPa);
  const step = niceStep((most - least || Math.abs(most) || 1) / 3);
  const from = Math.floor(least / step) * step;
  const to = Math.ceil(most / step) * step;
  const major = multiples(step, from, to);
  const minor = multiples(step / 2, from, to).filter((stress) => !major.includes(stress));
  return { from, to, major, minor };
}
