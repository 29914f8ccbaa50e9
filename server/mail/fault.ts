const longestFault = 300;

/** What the mail server said, in one line, and whether its no is final (a reply of 500 to 599). */
export function faultOf(error: unknown): { words: string; isFinal: boolean } {
  const words = error instanceof Error ? error.message : String(error);
  const code =
    typeof error === 'object' && error !== null && 'responseCode' in error && typeof error.responseCode === 'number'
      ? error.responseCode
      : 0;
  return { words: words.replace(/\s+/g, ' ').slice(0, longestFault), isFinal: code >= 500 && code < 600 };
}
