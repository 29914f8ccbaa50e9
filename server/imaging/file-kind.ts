import { open } from 'node:fs/promises';

/** Kinds of file whose content is read; the name a file came with plays no part. */
export type FileKind = 'TIFF' | 'BigTIFF' | 'PNG' | 'JPEG' | 'WebP';

export type FileKindRead =
  { readonly kind: 'read'; readonly format: FileKind } | { readonly kind: 'refused'; readonly reason: string };

const wanted = 'Bring it in as TIFF, PNG, JPEG or WebP.';

const read = (format: FileKind): FileKindRead => ({ kind: 'read', format });
const refused = (reason: string): FileKindRead => ({ kind: 'refused', reason: `${reason} ${wanted}` });

const startsWith = (head: Buffer, bytes: readonly number[]) => bytes.every((byte, index) => head[index] === byte);
const textAt = (head: Buffer, from: number, to: number) => head.subarray(from, to).toString('latin1');

/** Tells what a file is by its first bytes, or in plain words why it is not taken. */
export async function readFileKind(path: string): Promise<FileKindRead> {
  const file = await open(path, 'r');
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(64), 0, 64, 0);
    return kindOfHead(buffer.subarray(0, bytesRead));
  } finally {
    await file.close();
  }
}

function kindOfHead(head: Buffer): FileKindRead {
  if (head.length === 0) return refused('The file is empty.');
  if (startsWith(head, [0xff, 0xd8, 0xff])) return read('JPEG');
  if (startsWith(head, [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])) return read('PNG');
  if (textAt(head, 0, 4) === 'RIFF' && textAt(head, 8, 12) === 'WEBP') return read('WebP');
  if (startsWith(head, [0x49, 0x49, 42, 0]) || startsWith(head, [0x4d, 0x4d, 0, 42])) return read('TIFF');
  if (startsWith(head, [0x49, 0x49, 43, 0]) || startsWith(head, [0x4d, 0x4d, 0, 43])) return read('BigTIFF');
  return otherKind(head);
}

function otherKind(head: Buffer): FileKindRead {
  if (textAt(head, 4, 8) === 'ftyp') {
    const isAvif = /avi[fs]/.test(textAt(head, 8, 32));
    return refused(isAvif ? 'This is an AVIF file.' : 'This is an HEIC file, as some telephones keep photographs.');
  }
  if (textAt(head, 0, 4) === 'GIF8') return refused('This is a GIF file, which holds too few tones for measuring.');
  if (textAt(head, 0, 4) === '%PDF') return refused('This is a PDF document, not an image.');
  if (startsWith(head, [0, 0, 0, 12, 0x6a, 0x50])) return refused('This is a JPEG 2000 file.');
  if (textAt(head, 0, 2) === 'BM') return refused('This is a BMP file.');
  if (/^\s*(<\?xml|<svg|<!doctype|<html)/i.test(head.toString('utf8')))
    return refused('This is a drawing or page in text, not an image of pixels.');
  return refused('This is not an image file that can be read.');
}
