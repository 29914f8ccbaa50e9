import { open } from 'node:fs/promises';
import type { FileKind } from './file-kind.ts';
import { readTiffScaleTags } from './tiff-directory.ts';

/** The pixel size a file tells of itself, and in which words; to be confirmed by a person, never trusted blindly. */
export type PixelSizeTag = { readonly pixelSizeUm: number; readonly source: string };

const umPerInch = 25_400;
const umPerCm = 10_000;
const umPerMetre = 1_000_000;
// Programs that know no scale write these; as a scale of a fracture surface they would mislead.
const emptyResolutions = [
  { perUnit: 72, unitUm: umPerInch },
  { perUnit: 96, unitUm: umPerInch },
  { perUnit: 25.4, unitUm: umPerInch },
  { perUnit: 10, unitUm: umPerCm },
  { perUnit: 1, unitUm: umPerCm },
  { perUnit: 1, unitUm: umPerInch },
];

/** Reads the pixel size from the tags of a file; null where it holds none worth looking at. */
export async function readPixelSizeTag(path: string, format: FileKind): Promise<PixelSizeTag | null> {
  if (format === 'TIFF' || format === 'BigTIFF') return fromTiff(path, format);
  if (format === 'PNG') return fromPng(await headOf(path));
  if (format === 'JPEG') return fromJpeg(path, await headOf(path));
  return null;
}

async function fromTiff(path: string, format: FileKind, startsAt = 0): Promise<PixelSizeTag | null> {
  const tags = await readTiffScaleTags(path, startsAt);
  if (!tags) return null;
  const described = fromDescription(tags.description ?? '', tags.xResolution);
  if (described) return described;
  const unit = tags.resolutionUnit === 3 ? { um: umPerCm, words: 'px/cm' } : { um: umPerInch, words: 'px/inch' };
  if (tags.resolutionUnit < 2 || !tags.xResolution) return null;
  return fromResolution(`${format} resolution`, tags.xResolution, unit);
}

/** OME-XML states the size of a pixel outright; a description with `unit=` says what the bare resolution counts. */
function fromDescription(description: string, xResolution: number | undefined): PixelSizeTag | null {
  const stated = /PhysicalSizeX="([\d.eE+-]+)"/.exec(description);
  const unit = /PhysicalSizeXUnit="([^"]+)"/.exec(description)?.[1] ?? 'µm';
  const perUnit = umOfUnit(unit);
  if (stated && perUnit) return sized(Number(stated[1]) * perUnit, `TIFF description, ${stated[1]} ${unit} a pixel`);
  const bare = /^unit=(.+)$/m.exec(description)?.[1]?.trim();
  const bareUm = bare ? umOfUnit(bare.replaceAll('\\u00B5', 'µ')) : null;
  if (!bareUm || !xResolution) return null;
  return sized(bareUm / xResolution, `TIFF description, ${figures(xResolution)} px/${bare}`);
}

function umOfUnit(unit: string): number | null {
  const known: Readonly<Record<string, number>> = {
    nm: 0.001,
    µm: 1,
    μm: 1,
    um: 1,
    micron: 1,
    microns: 1,
    mm: 1000,
    cm: umPerCm,
    inch: umPerInch,
  };
  return known[unit] ?? null;
}

/** PNG pHYs: pixels in a metre, where its unit byte is 1. */
function fromPng(head: Buffer): PixelSizeTag | null {
  for (let at = 8; at + 12 <= head.length;) {
    const length = head.readUInt32BE(at);
    const type = head.subarray(at + 4, at + 8).toString('latin1');
    if (type === 'IDAT' || length > head.length) return null;
    if (type === 'pHYs' && at + 17 <= head.length) {
      const isMetre = head[at + 16] === 1;
      return isMetre
        ? fromResolution('PNG resolution', head.readUInt32BE(at + 8), { um: umPerMetre, words: 'px/m' })
        : null;
    }
    at += length + 12;
  }
  return null;
}

/** The resolution of a JPEG: whole pixels in a unit right after its start (JFIF), else the fraction in its Exif part. */
async function fromJpeg(path: string, head: Buffer): Promise<PixelSizeTag | null> {
  if (head.length >= 18 && head.subarray(6, 10).toString('latin1') === 'JFIF' && head[13] > 0) {
    const unit = head[13] === 2 ? { um: umPerCm, words: 'px/cm' } : { um: umPerInch, words: 'px/inch' };
    const found = fromResolution('JPEG density', head.readUInt16BE(14), unit);
    if (found) return found;
  }
  const exifAt = head.subarray(0, 70_000).indexOf('Exif\0\0', 0, 'latin1');
  return exifAt < 0 ? null : fromTiff(path, 'JPEG', exifAt + 6);
}

function fromResolution(name: string, perUnit: number, unit: { um: number; words: string }): PixelSizeTag | null {
  const pixelsPerUm = perUnit / unit.um;
  const isEmpty = emptyResolutions.some(
    (empty) => Math.abs(pixelsPerUm / (empty.perUnit / empty.unitUm) - 1) < 0.002, // whole px/m round 72 per inch
  );
  return isEmpty ? null : sized(1 / pixelsPerUm, `${name} ${figures(perUnit)} ${unit.words}`);
}

function sized(pixelSizeUm: number, source: string): PixelSizeTag | null {
  return Number.isFinite(pixelSizeUm) && pixelSizeUm > 0 ? { pixelSizeUm, source } : null;
}

/** At most six figures, a narrow space at the thousands. */
function figures(value: number): string {
  const [whole = '', part] = String(Number(value.toPrecision(6))).split('.');
  const spaced = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, '\u202F') : whole;
  return part === undefined ? spaced : `${spaced}.${part}`;
}

async function headOf(path: string): Promise<Buffer> {
  const file = await open(path, 'r');
  try {
    const size = 1 << 20; // pHYs stands before the pixels, after at most a colour profile
    const { buffer, bytesRead } = await file.read(Buffer.alloc(size), 0, size, 0);
    return buffer.subarray(0, bytesRead);
  } finally {
    await file.close();
  }
}
