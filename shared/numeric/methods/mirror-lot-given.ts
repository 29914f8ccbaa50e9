import type { MirrorLot } from '../mirror/mirror-lot.ts';
import { listGiven } from './given.ts';
import type { Caution, GivenInputs } from './method.ts';

// Trade practice: fewer, or a narrower range, tell a slope from a mean only by chance.
const enoughMirrors = 10;
const wideRange = 4;

/** The lot of mirrors among the inputs of a fit. */
export function mirrorLotGiven(given: GivenInputs): MirrorLot {
  return { radiiMm: listGiven(given, 'R'), stressesMPa: listGiven(given, 'stress') };
}

/** What is to be known of a lot of mirrors before its fit is believed. */
export function mirrorLotCautions(given: GivenInputs): Caution[] {
  const radii = listGiven(given, 'R');
  const found: Caution[] = [];
  if (radii.length < enoughMirrors) {
    const sentence = `${radii.length} mirrors: ${enoughMirrors} or more are recommended for a constant.`;
    found.push({ code: 'few-mirrors', weight: 'note', sentence });
  }
  const range = Math.max(...radii) / Math.min(...radii);
  if (range < wideRange) {
    const sentence = `The largest radius is ${range.toFixed(1)} times the smallest: below ${wideRange} slope and intercept can hardly be told apart.`;
    found.push({ code: 'narrow-range-of-radii', weight: 'note', sentence });
  }
  return found;
}

/** "8 mirrors", for the formula with numbers. */
export function mirrorsInWords(given: GivenInputs): string {
  return `${listGiven(given, 'R').length} mirrors`;
}
