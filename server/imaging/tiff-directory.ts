import { open, type FileHandle } from 'node:fs/promises';

/** What the first directory of a TIFF says of its scale; what it does not say is absent. */
export type TiffScaleTags = {
  /** Pixels in a resolution unit, as the fraction the file holds. */
  readonly xResolution?: number;
  readonly yResolution?: number;
  /** 1 none, 2 inch, 3 centimetre; a file that says nothing means inch (TIFF 6.0, tag 296). */
  readonly resolutionUnit: number;
  readonly description?: string;
};

const tags = { description: 270, xResolution: 282, yResolution: 283, resolutionUnit: 296 } as const;
// Sizes of the field types of TIFF 6.0 and BigTIFF, bytes, by type number.
const sizeOfType: Readonly<Record<number, number>> = {
  1: 1,
  2: 1,
  3: 2,
  4: 4,
  5: 8,
  6: 1,
  7: 1,
  8: 2,
  9: 4,
  10: 8,
  11: 4,
  12: 8,
  16: 8,
  17: 8,
  18: 8,
};
// A directory of more entries, or a longer description, is a damaged file.
const mostEntries = 4096;
const longestDescription = 1_000_000;

type Source = { readonly file: FileHandle; readonly startsAt: number };
type Form = { readonly big: boolean; readonly little: boolean };
type Entry = { readonly tag: number; readonly type: number; readonly count: number; readonly value: Buffer };

/**
 * Reads the scale tags of a classic or big TIFF, either byte order, from its first directory.
 * Source: TIFF 6.0 sections 2 and 8; BigTIFF differs in 8-byte counts and offsets. A damaged directory answers null.
 * `startsAt`: where in the file the directory's own header stands, bytes; not 0 for the Exif part of a JPEG.
 */
export async function readTiffScaleTags(path: string, startsAt = 0): Promise<TiffScaleTags | null> {
  const file = await open(path, 'r');
  try {
    return await readDirectory({ file, startsAt });
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  } finally {
    await file.close();
  }
}

async function readDirectory(source: Source): Promise<TiffScaleTags> {
  const head = await bytesAt(source, 0, 16);
  const form: Form = { little: head[0] === 0x49, big: uint(head, 2, 2, head[0] === 0x49) === 43 };
  const first = form.big ? uint(head, 8, 8, form.little) : uint(head, 4, 4, form.little);
  const entries = await listEntries(source, form, first);
  const find = (tag: number) => entries.find((entry) => entry.tag === tag);
  const unit = find(tags.resolutionUnit);
  return {
    xResolution: await rationalOf(source, form, find(tags.xResolution)),
    yResolution: await rationalOf(source, form, find(tags.yResolution)),
    resolutionUnit: unit ? uint(unit.value, 0, 2, form.little) : 2,
    description: await textOf(source, form, find(tags.description)),
  };
}

async function listEntries(source: Source, form: Form, offset: number): Promise<Entry[]> {
  const countSize = form.big ? 8 : 2;
  const entrySize = form.big ? 20 : 12;
  const count = uint(await bytesAt(source, offset, countSize), 0, countSize, form.little);
  if (count > mostEntries) throw new RangeError('too many entries');
  const bytes = await bytesAt(source, offset + countSize, count * entrySize);
  return Array.from({ length: count }, (_, index) => {
    const entry = bytes.subarray(index * entrySize, (index + 1) * entrySize);
    return {
      tag: uint(entry, 0, 2, form.little),
      type: uint(entry, 2, 2, form.little),
      count: uint(entry, 4, form.big ? 8 : 4, form.little),
      value: entry.subarray(form.big ? 12 : 8),
    };
  });
}

/** The bytes of an entry: in the entry itself where they fit, else where it points. */
async function valueOf(source: Source, form: Form, entry: Entry): Promise<Buffer> {
  const size = (sizeOfType[entry.type] ?? 1) * entry.count;
  if (size > longestDescription) throw new RangeError('too long');
  if (size <= entry.value.length) return entry.value.subarray(0, size);
  return bytesAt(source, uint(entry.value, 0, entry.value.length, form.little), size);
}

async function rationalOf(source: Source, form: Form, entry: Entry | undefined): Promise<number | undefined> {
  if (!entry || entry.type !== 5 || entry.count < 1) return undefined;
  const bytes = await valueOf(source, form, entry);
  const below = uint(bytes, 4, 4, form.little);
  return below === 0 ? undefined : uint(bytes, 0, 4, form.little) / below;
}

async function textOf(source: Source, form: Form, entry: Entry | undefined): Promise<string | undefined> {
  if (!entry || entry.type !== 2) return undefined;
  return (await valueOf(source, form, entry)).toString('utf8').replace(/\0+$/, '');
}

function uint(bytes: Buffer, offset: number, size: number, little: boolean): number {
  if (size === 8) return Number(little ? bytes.readBigUInt64LE(offset) : bytes.readBigUInt64BE(offset));
  return little ? bytes.readUIntLE(offset, size) : bytes.readUIntBE(offset, size);
}

async function bytesAt(source: Source, position: number, size: number): Promise<Buffer> {
  const { bytesRead, buffer } = await source.file.read(Buffer.alloc(size), 0, size, source.startsAt + position);
  if (bytesRead < size && position > 0) throw new RangeError('cut short');
  return buffer;
}
