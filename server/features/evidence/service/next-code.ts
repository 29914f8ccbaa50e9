import type { FragmentWay } from '#shared/vocabulary/pieces.ts';

const letterOf: Readonly<Record<FragmentWay | 'missing', string>> = {
  break: 'F',
  cut: 'C',
  replica: 'R',
  section: 'S',
  powder: 'P',
  missing: 'M',
};

/**
 * The code of the next piece of a case: F1, F2, … for what broke off, M1, … for what is not there; a piece made from
 * another carries its code before its own, F1/R1. Each letter counts through the whole case.
 * @param codes every code given in the case so far
 */
export function nextCode(
  codes: readonly string[],
  piece: { way: FragmentWay | 'missing'; parentCode: string | null },
): string {
  const letter = letterOf[piece.way];
  const given = codes.flatMap((code) => {
    const own = code.split('/').at(-1) ?? '';
    return own.startsWith(letter) ? [Number(own.slice(letter.length))] : [];
  });
  const own = `${letter}${Math.max(0, ...given) + 1}`;
  return piece.parentCode === null ? own : `${piece.parentCode}/${own}`;
}
