import type { FractographView, ScaleView } from '#shared/contracts/fractographs.ts';
import { formatNumber } from '#shared/wording/quantity.ts';

const waysInWords = {
  'file tags': 'from the file’s own tags',
  'burned bar': 'from the bar on the image',
  graticule: 'from a graticule',
  typed: 'typed',
} as const;

/** "1.100 µm per pixel, CAL-02, stage micrometer SM-2"; x and y apart where they differ. */
export function scaleInWords(scale: ScaleView): string {
  const { pixelSizeXUm: x, pixelSizeYUm: y } = scale;
  const size = (value: number) => formatNumber(value, { significantFigures: 4 });
  const sizes = x === y ? `${size(x)} µm per pixel` : `${size(x)} µm per pixel across, ${size(y)} down`;
  return `${sizes}, ${scale.code ?? waysInWords[scale.way]}: ${scale.source}`;
}

/** U / value at k = 2, per cent. */
export function scaleUncertaintyInWords(scale: ScaleView): string {
  return `± ${formatNumber(scale.relativeUncertainty * 200, { significantFigures: 2 })} % (k = 2)`;
}

/** What should be known of an image so that it could be taken again and is not (guessed is none of it). */
export function missingFacts(image: FractographView): string[] {
  const wanted = [
    [image.fragment, 'piece'],
    [image.face, 'face'],
    [image.view, 'view'],
    [image.instrument, 'instrument'],
    [image.objective, 'objective'],
    [image.fieldWidthMm, 'field width'],
    [image.tiltDeg, 'tilt'],
    [image.illumination, 'light'],
    [image.coating, 'coating'],
    [image.takenBy, 'who took it'],
    [image.takenOn, 'date taken'],
  ] as const;
  return wanted.filter(([value]) => value === null || value === '').map(([, word]) => word);
}
