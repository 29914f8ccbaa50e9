export const markActs = {
  'mark.drawn': { words: 'drew a mark', authorship: true },
  'mark.moved': { words: 'moved a mark', authorship: true },
  'mark.changed': { words: 'changed a mark', authorship: true },
  'mark.removed': { words: 'removed a mark', authorship: true },
  'mark.restored': { words: 'brought a mark back', authorship: true },
  'measurement.read': { words: 'read a length', authorship: true },
} as const;
