export const findingsActs = {
  'findings.written': { words: 'wrote in the findings', authorship: true },
  'value.bound': { words: 'bound a value into the findings', authorship: true },
  'value.renewed': { words: 'took the new value in the findings', authorship: true },
  'figure.placed': { words: 'placed a figure', authorship: true },
  'figure.renewed': { words: 'drew a figure again', authorship: true },
  'findings.version-kept': { words: 'kept a version of the findings' },
} as const;
