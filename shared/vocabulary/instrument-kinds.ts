export const instrumentKinds = [
  'stereo',
  'compound',
  'electron',
  'profilometer',
  'camera',
  'micrometer',
  'load cell',
  'polariscope',
] as const;
export type InstrumentKind = (typeof instrumentKinds)[number];
