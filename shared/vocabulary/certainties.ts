export const certainties = ['certain', 'likely', 'possible'] as const;
export type Certainty = (typeof certainties)[number];
