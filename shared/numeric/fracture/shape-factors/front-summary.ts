import { largestBetween } from '../../special-functions/largest-between.ts';
import { radiansFromDegrees, type FrontSummary } from './crack-front.ts';

// Whole degrees: far finer than the front turns.
const scanSteps = 90;

/** Shape factor at both ends of a quarter of the front and the largest in between; `at` takes the angle in radians. */
export function summariseFront(at: (angleRad: number) => number): FrontSummary {
  const of = (degrees: number) => at(radiansFromDegrees(degrees));
  const largest = largestBetween({ from: 0, to: 90, steps: scanSteps, of });
  return {
    firstEndFactor: of(0),
    secondEndFactor: of(90),
    largestFactor: largest.value,
    largestAtDegrees: largest.at,
  };
}
