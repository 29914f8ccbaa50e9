import type { SignatureMeaning } from '../vocabulary/signatures.ts';

/** What each signature says, in the signer's own voice. */
export const meaningWords: Readonly<Record<SignatureMeaning, string>> = {
  authored: 'I wrote this, and it is what I found',
  checked: 'I have checked this, and none of it is mine',
  approved: 'I have read this, and it is borne out',
};
