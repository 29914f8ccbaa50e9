import type { RefusalCode } from '../numeric/refusal-codes.ts';

const sentences: Readonly<Record<RefusalCode, (field: string) => string>> = {
  'non-finite-input': (field) => `${field} is missing or is not a number: enter one.`,
  'non-positive-span': (field) => `${field} must be more than 0.`,
  'negative-inner-span': (field) => `${field} must be 0 or more.`,
  'inner-span-not-less-than-outer': (field) => `${field} must be less than the outer span.`,
  'negative-load': (field) => `${field} must be 0 or more; enter its size without a sign.`,
  'non-positive-dimension': (field) => `${field} must be more than 0.`,
  'depth-outside-section': (field) => `${field} must lie between 0, the tensile face, and the depth of the section.`,
  'position-outside-span': (field) =>
    `${field} must lie between the outer rollers, at most half the outer span from mid-span.`,
  'chamfer-too-large': (field) => `${field} must be at most half of the smaller side of the section.`,
  'diameters-out-of-order': (field) => `${field} is out of order: load, support and disc must grow in that order.`,
  'poisson-out-of-range': (field) => `${field} must be 0 or more and less than 0.5.`,
  'non-positive-stress': (field) => `${field} must be more than 0.`,
  'non-positive-flaw-size': (field) => `${field} must be more than 0.`,
  'non-positive-mirror-radius': (field) => `${field} must be more than 0.`,
  'non-positive-mirror-constant': (field) => `${field} must be more than 0.`,
  'non-positive-toughness': (field) => `${field} must be more than 0.`,
  'non-positive-shape-factor': (field) => `${field} must be more than 0.`,
  'non-positive-rate': (field) => `${field} must be more than 0.`,
  'flaw-deeper-than-section': (field) => `${field} reaches through the section: it must be less than the thickness.`,
  'outside-validity-range': (field) => `${field} is outside the range in which the formula holds.`,
  'too-few-points': (field) => `${field} has too few entries: add more.`,
  'points-in-line': (field) => `${field} lie on one line: place them further round the curve.`,
  'points-not-on-an-ellipse': (field) =>
    `${field} do not lie on an ellipse about this centre: place more of them round it.`,
  'not-a-choice': (field) => `${field} is not one of the choices: choose one of them.`,
  'unreadable-code': (field) =>
    `${field} cannot be read: write codes such as P^V, joined by one kind of &, / or +, each with ? where it is not certain.`,
  'missing-uncertainty': (field) => `${field} has no uncertainty: state one that is more than 0.`,
  'negative-uncertainty': (field) => `The uncertainty of ${field} must be 0 or more.`,
  'unknown-method': (field) => `There is no method “${field}” in this version: choose one from the list.`,
  'unknown-unit': (field) => `${field} has a unit that is not known here or measures something else.`,
  'unknown-input': (field) => `${field} does not belong to this method: take it out.`,
};

/** Why no number is given, and what would be right, in one sentence that begins with the label of the field. */
export function refusalInWords(code: RefusalCode, fieldLabel: string): string {
  return sentences[code](fieldLabel);
}
