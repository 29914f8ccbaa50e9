import type { FractographView, ScaleReading } from '#shared/contracts/fractographs.ts';
import { distancePx } from '#shared/numeric/imaging/distance.ts';
import { pixelSizeFromScaleBar } from '#shared/numeric/imaging/pixel-size.ts';
import { OutsideDomain } from '#shared/numeric/outside-domain.ts';
import { readingsAreApart } from '#shared/rules/calibration-check.ts';
import type { CalibrationWay } from '#shared/vocabulary/fractographs.ts';
import type { Json } from '../../../audit/record-act.ts';
import { Problem } from '../../../http/problem.ts';

type OwnReading = Exclude<ScaleReading, { way: 'kept calibration' }>;

/** A scale read off one image: what its calibration record will hold, and what a person must be asked about it. */
export type ScaleRead = {
  readonly way: CalibrationWay;
  readonly pixelSizeXUm: number;
  readonly pixelSizeYUm: number;
  readonly relativeUncertainty: number;
  readonly source: string;
  /** All that was typed and drawn, kept beside the values. */
  readonly reading: Json;
  /** Set where two readings of the bar stand too far apart. */
  readonly spreadDoubt: string | null;
};

/** Works a reading out to a pixel size with its uncertainty. @throws Problem not-valid, naming the field */
export function readScale(reading: OwnReading, image: FractographView, readBy: string): ScaleRead {
  if (reading.way === 'burned bar') return fromBar(reading);
  if (reading.way === 'file tags') return fromTags(reading, image, readBy);
  return {
    ...reading,
    pixelSizeYUm: reading.pixelSizeYUm ?? reading.pixelSizeXUm,
    reading: { ...reading },
    spreadDoubt: null,
  };
}

function fromBar(reading: Extract<OwnReading, { way: 'burned bar' }>): ScaleRead {
  const lengthsPx = reading.readings.map(({ from, to }) => distancePx(from, to));
  const read = pixelSizeOf(lengthsPx, reading);
  const spread = `${(read.relativeSpread * 100).toFixed(1)} %`;
  const times = lengthsPx.length === 2 ? 'twice' : `${lengthsPx.length} times`;
  return {
    way: 'burned bar',
    pixelSizeXUm: read.pixelSizeUm,
    pixelSizeYUm: read.pixelSizeUm,
    relativeUncertainty: read.standardUncertaintyUm / read.pixelSizeUm,
    source: `bar of ${reading.typed} read ${times}, ${spread} apart`,
    reading: { ...reading, lengthsPx, meanLengthPx: read.meanLengthPx, relativeSpread: read.relativeSpread },
    spreadDoubt: readingsAreApart(read.relativeSpread)
      ? `The readings of the bar stand ${spread} apart, more than 3 %. Read it once more, or say why they may.`
      : null,
  };
}

function pixelSizeOf(lengthsPx: number[], reading: Extract<OwnReading, { way: 'burned bar' }>) {
  try {
    return pixelSizeFromScaleBar({
      lengthsPx,
      knownLengthUm: reading.barLengthUm,
      knownLengthStandardUncertaintyUm: reading.barStandardUncertaintyUm,
    });
  } catch (error) {
    if (!(error instanceof OutsideDomain)) throw error;
    throw new Problem('not-valid', 'A reading along the bar has a length above 0 px: draw from end to end.', {
      field: error.field === 'lengthsPx' ? 'reading.readings' : 'reading.barLengthUm',
    });
  }
}

function fromTags(
  reading: Extract<OwnReading, { way: 'file tags' }>,
  image: FractographView,
  readBy: string,
): ScaleRead {
  const { tagPixelSizeUm, tagSource } = image;
  if (tagPixelSizeUm === null)
    throw new Problem('not-valid', 'This file tells no pixel size of itself.', { field: 'reading.way' });
  // What was looked at and what the file says are the same number; only its way through text may round it.
  if (Math.abs(reading.pixelSizeUm / tagPixelSizeUm - 1) > 1e-6)
    throw new Problem('not-valid', `The file says ${tagPixelSizeUm} µm/px; to take another size, type it.`, {
      field: 'reading.pixelSizeUm',
    });
  return {
    way: 'file tags',
    pixelSizeXUm: tagPixelSizeUm,
    pixelSizeYUm: tagPixelSizeUm,
    relativeUncertainty: reading.relativeUncertainty,
    source: `${tagSource ?? 'tags of the file'}, confirmed by ${readBy}`,
    reading: { ...reading },
    spreadDoubt: null,
  };
}
