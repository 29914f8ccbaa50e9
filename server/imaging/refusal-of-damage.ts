// What fails on our side, not in the file: no room left, or a place that can't be written. The job is tried again.
const ourSide =
  /no space|write failed|unable to (write|create)|ENOSPC|EACCES|EMFILE|out of memory|input file is missing/i;

/**
 * Why a file that failed to decode is refused, in plain words.
 * @throws the error itself where the fault lies on our side
 */
export function refusalOfDamage(error: unknown): string {
  const message = error instanceof Error ? error.message : String(error);
  if (ourSide.test(message)) throw error;
  if (/pixel limit/i.test(message)) return 'The image has more pixels than this laboratory takes.';
  if (/timeout/i.test(message))
    return 'Reading this image took longer than is allowed. Bring it in as an uncompressed TIFF.';
  return 'The image could not be read whole: its end is missing or it is damaged. Bring it in again from where it was taken.';
}
