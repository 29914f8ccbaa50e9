import type { OriginLies } from '../vocabulary/pieces.ts';

/** A piece that is not there, as far as its limit sentence speaks of it. */
export type MissingPiece = {
  readonly code: string;
  readonly description: string;
  readonly missingReason: string;
  readonly originLies: OriginLies;
};

/**
 * The sentence that stands among the limits of the findings while the origin may lie on a piece that is not there;
 * null where the origin does not lie on it.
 */
export function limitSentence(piece: MissingPiece): string | null {
  if (piece.originLies === 'no') return null;
  const { code, description, missingReason } = piece;
  const gone = `${code} (${withoutStop(description)}) was not there to be examined: ${withoutStop(missingReason)}.`;
  return piece.originLies === 'yes'
    ? `${gone} The origin may lie on it, and what is said of the origin holds only within that limit.`
    : `${gone} Whether the origin lies on it is not known.`;
}

function withoutStop(text: string): string {
  return text.trim().replace(/\.+$/, '');
}
