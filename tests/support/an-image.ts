import sharp from 'sharp';
import { setTimeout as wait } from 'node:timers/promises';
import { FractographView } from '#shared/contracts/fractographs.ts';
import type { Admitted } from './test-server.ts';

export type ImageKind =
  'tiff' | 'tiff 16 bit' | 'big tiff' | 'big tiff 16 bit' | 'png' | 'png 16 bit' | 'jpeg' | 'webp';

/** A grey ramp of so many pixels with a little texture, as a file of the kind asked for. */
export async function anImage(
  kind: ImageKind,
  size: { widthPx: number; heightPx: number } = { widthPx: 600, heightPx: 400 },
  tags: { pixelsPerMm?: number } = {},
): Promise<Uint8Array> {
  const { widthPx: width, heightPx: height } = size;
  const deep = kind.endsWith('16 bit');
  const samples = deep ? new Uint16Array(width * height) : new Uint8Array(width * height);
  for (let at = 0; at < samples.length; at++) {
    const share = (at % width) / width;
    samples[at] = deep ? 900 + Math.round(share * 3000) + (at % 7) : 20 + Math.round(share * 200) + (at % 7);
  }
  const raw = { width, height, channels: 1 } as const;
  const grey = sharp(samples, { raw, limitInputPixels: false }).toColourspace(deep ? 'grey16' : 'b-w');
  const { pixelsPerMm } = tags;
  const resolution = pixelsPerMm ? { xres: pixelsPerMm, yres: pixelsPerMm, resolutionUnit: 'cm' as const } : {};
  if (kind.includes('tiff'))
    return grey.tiff({ compression: 'none', bigtiff: kind.startsWith('big'), ...resolution }).toBuffer();
  const scaled = pixelsPerMm ? grey.withMetadata({ density: pixelsPerMm * 25.4 }) : grey;
  if (kind.startsWith('png')) return scaled.png().toBuffer();
  return kind === 'jpeg' ? scaled.jpeg({ quality: 90 }).toBuffer() : scaled.webp({ lossless: true }).toBuffer();
}

/** Brings a file in as that person, with what else the form says. */
export function bringIn(
  person: Admitted,
  number: string,
  file: { name: string; bytes: Uint8Array },
  fields: Record<string, string> = {},
) {
  return person.client.sendFile(`/cases/${number}/fractographs`, file, fields);
}

/** Waits until a fractograph is ready or refused. */
export async function settled(
  person: Admitted,
  number: string,
  id: string,
  withinMs = 25_000,
): Promise<FractographView> {
  for (const end = Date.now() + withinMs; ; await wait(100)) {
    const { body } = await person.client.get(`/cases/${number}/fractographs/${id}`);
    const view = FractographView.parse(body);
    if (view.state === 'ready' || view.state === 'refused') return view;
    if (Date.now() > end) throw new Error(`Fig. ${view.figureNumber} is still ${view.state} (${view.progress})`);
  }
}

/** Brings an image in and waits until it is ready. */
export async function aReadyImage(person: Admitted, number: string, bytes: Uint8Array, name = 'face.tif') {
  const { status, body } = await bringIn(person, number, { name, bytes });
  if (status !== 202) throw new Error(`not brought in: ${JSON.stringify(body)}`);
  return settled(person, number, String(body.id));
}
