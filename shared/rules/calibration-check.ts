/** One way to the scale of an image that is at hand, to be held against another. */
export type WayAtHand = {
  /** In words, to be read in a sentence: "the file's own tag", "CAL-02 of the same objective". */
  readonly name: string;
  /** µm per image px, > 0. */
  readonly pixelSizeUm: number;
};

export type ScaleDoubt = {
  readonly against: string;
  /** Size of the chosen way over that of the other, dimensionless. */
  readonly ratio: number;
  readonly kind: 'apart' | 'near double' | 'near half' | 'near ten times' | 'near a tenth';
  readonly sentence: string;
};

// Two ways to one scale that differ by more than this need a person (job 3.6).
export const greatestDifference = 0.03;

const slips = [
  {
    factor: 2,
    kind: 'near double',
    words: 'nearly twice that',
    hint: 'Was it taken at half the magnification, or was the image made smaller by half?',
  },
  {
    factor: 0.5,
    kind: 'near half',
    words: 'nearly half that',
    hint: 'Was it taken at twice the magnification, or was the image made larger by two?',
  },
  {
    factor: 10,
    kind: 'near ten times',
    words: 'nearly ten times that',
    hint: 'Is a decimal point or a unit off by ten?',
  },
  {
    factor: 0.1,
    kind: 'near a tenth',
    words: 'nearly a tenth of that',
    hint: 'Is a decimal point or a unit off by ten?',
  },
] as const;

/**
 * Holds the chosen way to a scale against the others at hand. Every one more than 3 % off gives a doubt; where the two
 * stand within 3 % of ×2, ×½, ×10 or ×1/10, the doubt says which slip that usually is. No doubt: bind without asking.
 */
export function compareWays(chosen: WayAtHand, others: readonly WayAtHand[]): ScaleDoubt[] {
  return others.flatMap((other) => {
    const ratio = chosen.pixelSizeUm / other.pixelSizeUm;
    if (isNear(ratio, 1)) return [];
    const slip = slips.find((each) => isNear(ratio, each.factor));
    const kind = slip?.kind ?? 'apart';
    return [{ against: other.name, ratio, kind, sentence: sentenceOf(chosen, other, ratio, slip) }];
  });
}

/** Whether two readings of one bar stand further apart than a person's hand explains. `relativeSpread` is (largest − smallest) / mean. */
export function readingsAreApart(relativeSpread: number): boolean {
  return relativeSpread > greatestDifference;
}

function isNear(ratio: number, factor: number): boolean {
  // A hair wider than 3 %, so that sizes typed with few digits at exactly 3 % do not fall on either side by rounding.
  return Math.abs(ratio / factor - 1) <= greatestDifference + 1e-9;
}

function sentenceOf(
  chosen: WayAtHand,
  other: WayAtHand,
  ratio: number,
  slip: (typeof slips)[number] | undefined,
): string {
  const sizes = `${chosen.name} gives ${sized(chosen.pixelSizeUm)}, ${other.name} ${sized(other.pixelSizeUm)}`;
  if (slip) return capital(`${sizes}: ${slip.words}. ${slip.hint}`);
  const percent = Math.abs(ratio - 1) * 100;
  return capital(`${sizes}: ${percent < 10 ? percent.toFixed(1) : percent.toFixed(0)} % apart, more than 3 %.`);
}

function capital(sentence: string): string {
  return sentence.charAt(0).toUpperCase() + sentence.slice(1);
}

function sized(pixelSizeUm: number): string {
  return `${Number(pixelSizeUm.toPrecision(4))} µm/px`;
}
