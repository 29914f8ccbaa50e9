export const estimateActs = {
  'estimate.made': { words: 'made an estimate', authorship: true },
  'estimate.renewed': { words: 'made an estimate again', authorship: true },
  'estimate.set-aside': { words: 'set an estimate aside', authorship: true },
  'estimate.taken-up': { words: 'took an estimate up again', authorship: true },
  'stale.kept': { words: 'kept an old value with a reason', authorship: true },
} as const;
