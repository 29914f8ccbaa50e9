import { fourPointWedgingError } from '../bending/four-point-wedging-error.ts';
import { threePointWedgingError } from '../bending/three-point-wedging-error.ts';
import { numberGiven, uncertaintyGiven } from './given.ts';
import type { Caution, GivenInputs, Outputs } from './method.ts';

// Span over depth at which shear and contact start to count in a bar: trade practice.
const leastSpanOverDepth3 = 10;
const leastArmOverDepth4 = 2.5;
// Reach of contact stress, in depths from the roller: trade practice.
const contactReach = 0.5;

const percent = (fraction: number) => `${(100 * fraction).toFixed(1)} %`;

/** Load and section: what holds for every bar. */
export function sectionCautions(given: GivenInputs): Caution[] {
  const cautions: Caution[] = [];
  if (numberGiven(given, 'load') === 0) {
    cautions.push({ code: 'zero-load', weight: 'warning', sentence: 'The load is zero, so the stress is zero.' });
  }
  if (numberGiven(given, 'depth') > numberGiven(given, 'width')) {
    cautions.push({
      code: 'depth-above-width',
      weight: 'warning',
      sentence: 'The depth is larger than the width: check that depth is the side along the load.',
    });
  }
  return cautions;
}

/** A three-point bar short against its depth. */
export function slenderness3Cautions(given: GivenInputs): Caution[] {
  if (numberGiven(given, 'outerSpan') / numberGiven(given, 'depth') >= leastSpanOverDepth3) return [];
  const sentence = `The span is less than ${leastSpanOverDepth3} depths: shear and contact stress are no longer small.`;
  return [{ code: 'short-span', weight: 'warning', sentence }];
}

/** A four-point bar with a short moment arm. */
export function slenderness4Cautions(given: GivenInputs): Caution[] {
  if (armMm(given) / numberGiven(given, 'depth') >= leastArmOverDepth4) return [];
  const sentence = `The moment arm is less than ${leastArmOverDepth4} depths: shear and contact stress are no longer small.`;
  return [{ code: 'short-arm', weight: 'warning', sentence }];
}

/** The sign of the stress where the fracture is said to have begun. */
export function compressionCautions(outputs: Outputs): Caution[] {
  const { localStress } = outputs;
  if (typeof localStress !== 'number' || localStress >= 0) return [];
  const sentence = 'The origin is in compression: check the origin or the geometry.';
  return [{ code: 'origin-in-compression', weight: 'warning', sentence }];
}

/** Where the origin lies along a three-point bar. */
export function position3Cautions(given: GivenInputs): Caution[] {
  const cautions: Caution[] = [];
  const [x, depth, span] = [numberGiven(given, 'x'), numberGiven(given, 'depth'), numberGiven(given, 'outerSpan')];
  if (Math.abs(x) < depth) {
    const size = percent(-threePointWedgingError({ depthMm: depth, outerSpanMm: span }));
    const sentence = `The origin is within one depth of the loading roller: opposite it the true stress on the tensile face is lower by about ${size}.`;
    cautions.push({ code: 'wedging', weight: 'note', sentence });
  }
  if (Math.abs(x) < 2 * (uncertaintyGiven(given, 'x') ?? 0)) {
    const sentence =
      'The position is closer to mid-span than twice its uncertainty: the stress has a peak there, and the first-order uncertainty overstates the spread.';
    cautions.push({ code: 'first-order-at-peak', weight: 'note', sentence });
  }
  return cautions;
}

/** Where the origin lies along a four-point bar. */
export function position4Cautions(given: GivenInputs): Caution[] {
  const cautions: Caution[] = [];
  const depth = numberGiven(given, 'depth');
  const halfInner = numberGiven(given, 'innerSpan') / 2;
  const away = Math.abs(numberGiven(given, 'x'));
  const fromRoller = Math.abs(away - halfInner);
  if (away > halfInner) {
    const sentence =
      'The origin is outside the inner span: the stress falls towards the outer roller and is taken there.';
    cautions.push({ code: 'outside-inner-span', weight: 'note', sentence });
  }
  if (fromRoller < contactReach * depth) {
    const sentence = 'The origin is within half a depth of an inner roller: contact stress may have taken part.';
    cautions.push({ code: 'contact-zone', weight: 'warning', sentence });
  }
  if (fromRoller < depth) {
    const spans = { outerSpanMm: numberGiven(given, 'outerSpan'), innerSpanMm: numberGiven(given, 'innerSpan') };
    const size = percent(-fourPointWedgingError({ depthMm: depth, ...spans }));
    const sentence = `The origin is within one depth of an inner roller: opposite it the true stress on the tensile face is lower by about ${size}.`;
    cautions.push({ code: 'wedging', weight: 'note', sentence });
  }
  if (fromRoller < 2 * (uncertaintyGiven(given, 'x') ?? 0)) {
    const sentence =
      'The position is closer to an inner roller than twice its uncertainty: the stress bends there, and the first-order uncertainty is rough.';
    cautions.push({ code: 'first-order-at-bend', weight: 'note', sentence });
  }
  return cautions;
}

function armMm(given: GivenInputs): number {
  return (numberGiven(given, 'outerSpan') - numberGiven(given, 'innerSpan')) / 2;
}
