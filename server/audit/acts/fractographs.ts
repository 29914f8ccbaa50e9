export const fractographActs = {
  'fractograph.received': { words: 'brought in a fractograph' },
  'fractograph.refused': { words: 'refused a file' },
  'fractograph.ready': { words: 'cut the tiles of a fractograph' },
  'fractograph.described': { words: 'described a fractograph' },
  'calibration.read': { words: 'read a scale', authorship: true },
  'calibration.bound': { words: 'bound a scale to a fractograph', authorship: true },
} as const;
