export const evidenceActs = {
  'part.entered': { words: 'entered a part' },
  'part.changed': { words: 'changed a part' },
  'fragment.received': { words: 'received a piece' },
  'fragment.changed': { words: 'changed a piece' },
  'fragment.missed': { words: 'noted a missing piece' },
  'mates.paired': { words: 'paired mating faces' },
  'mates.parted': { words: 'parted mating faces' },
} as const;
