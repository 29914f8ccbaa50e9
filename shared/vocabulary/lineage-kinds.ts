/** Records that stand in the lineage of a number, from what was seen to what is said. */
export const lineageKinds = [
  'fractograph',
  'calibration',
  'calibration binding',
  'mark version',
  'measurement',
  'material constant',
  'estimate',
  'comparison',
  'bound value',
  'figure',
] as const;
export type LineageKind = (typeof lineageKinds)[number];
