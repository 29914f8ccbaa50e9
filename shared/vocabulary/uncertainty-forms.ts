/** How an uncertainty is stated with a typed value: u itself, U at k = 2, or the half-width of a spread. */
export const uncertaintyForms = ['standard', 'expanded', 'rectangular', 'triangular'] as const;
export type UncertaintyForm = (typeof uncertaintyForms)[number];

export const uncertaintyFormWords: Readonly<Record<UncertaintyForm, string>> = {
  standard: 'standard uncertainty u',
  expanded: 'U at k = 2',
  rectangular: 'half-width, anywhere within',
  triangular: 'half-width, likeliest in the middle',
};
