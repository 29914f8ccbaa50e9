export const signatureMeanings = ['authored', 'checked', 'approved'] as const;
export type SignatureMeaning = (typeof signatureMeanings)[number];
