export type SealStroke = { x1: number; y1: number; x2: number; y2: number };

/**
 * The 64 strokes of a seal in a field of 100 × 100: one for each half-byte of a SHA-256 digest, clockwise from the top,
 * alternately begun on radii 19 and 21, and 5 to 26 long by the half-byte's value.
 * Refuses what is not 64 hexadecimal digits, because a seal must never be drawn from part of a digest.
 */
export function sealStrokes(digestHex: string): SealStroke[] {
  if (!/^[0-9a-f]{64}$/i.test(digestHex)) throw new Error('A seal is drawn from 64 hexadecimal digits.');
  return [...digestHex].map((digit, index) => {
    const angle = (index / 64) * 2 * Math.PI;
    const from = index % 2 === 0 ? 19 : 21;
    const to = from + 5 + (Number.parseInt(digit, 16) / 15) * 21;
    return {
      x1: 50 + from * Math.sin(angle),
      y1: 50 - from * Math.cos(angle),
      x2: 50 + to * Math.sin(angle),
      y2: 50 - to * Math.cos(angle),
    };
  });
}
