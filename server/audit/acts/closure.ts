export const closureActs = {
  'review.sent': { words: 'sent the case to review' },
  'review.sent-back': { words: 'sent the case back' },
  'note.accepted': { words: 'accepted a note of the readiness list' },
  'signature.given': { words: 'signed' },
  'case.closed': { words: 'closed and sealed the case' },
} as const;
