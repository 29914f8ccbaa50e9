/** What is read off a mark as a length. A direction is read too, but is no length and needs no scale. */
export const measuredQuantities = [
  'mirror radius',
  'flaw half-axis, depth',
  'flaw half-axis, along',
  'depth of origin',
  'length',
] as const;
export type MeasuredQuantity = (typeof measuredQuantities)[number];
