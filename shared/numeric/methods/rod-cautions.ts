import {
  compressionCautions,
  position3Cautions,
  position4Cautions,
  sectionCautions,
  slenderness3Cautions,
  slenderness4Cautions,
} from './bar-cautions.ts';
import type { Caution, GivenInputs, Outputs } from './method.ts';
import { asBar } from './rod-inputs.ts';

/** Load and span of a three-point rod. */
export function rod3Cautions(given: GivenInputs): Caution[] {
  return [...sectionCautions(given), ...slenderness3Cautions(asBar(given))];
}

/** Load and spans of a four-point rod. */
export function rod4Cautions(given: GivenInputs): Caution[] {
  return [...sectionCautions(given), ...slenderness4Cautions(asBar(given))];
}

/** As `rod3Cautions`, with where the origin lies. */
export function rod3LocalCautions(given: GivenInputs, outputs: Outputs): Caution[] {
  return [...rod3Cautions(given), ...compressionCautions(outputs), ...withoutWedging(position3Cautions(asBar(given)))];
}

/** As `rod4Cautions`, with where the origin lies. */
export function rod4LocalCautions(given: GivenInputs, outputs: Outputs): Caution[] {
  return [...rod4Cautions(given), ...compressionCautions(outputs), ...withoutWedging(position4Cautions(asBar(given)))];
}

/** The size of wedging is known for a strip, not for a round section. */
function withoutWedging(cautions: Caution[]): Caution[] {
  return cautions.filter(({ code }) => code !== 'wedging');
}
