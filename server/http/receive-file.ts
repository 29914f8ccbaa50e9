import { pipeline } from 'node:stream/promises';
import type { Request, Response } from 'express';
import multer, { type StorageEngine } from 'multer';
import type { Readable } from 'node:stream';
import type { Storage } from '../storage/storage.ts';
import { Problem } from './problem.ts';

export type ReceivedFile = { readonly fileName: string; readonly sha256: string; readonly bytes: number };
export type ReceivedForm = { readonly file: ReceivedFile; readonly fields: Readonly<Record<string, unknown>> };

// Enough for a caption and a few choices; a form with more is not one of ours.
const smallForm = { files: 1, fields: 20, fieldSize: 20_000, parts: 30 };

/**
 * Receives a form of one file, streamed straight into storage while it is hashed; it is never whole in memory. Where it
 * breaks off or is too large, nothing of it stays.
 * @throws Problem too-large, or not-valid for a form without a file
 */
export async function receiveFile(
  request: Request,
  response: Response,
  storage: Storage,
  largestFileBytes: number,
): Promise<ReceivedForm> {
  let file: ReceivedFile | null = null;
  let settled: Promise<void> = Promise.resolve();
  const engine: StorageEngine = {
    _handleFile: (_request, arriving, done) => {
      settled = keepWhole(request, arriving.stream, storage).then(
        (kept) => {
          file = { ...kept, fileName: plainName(arriving.originalname) };
          done(null, {});
        },
        (error: unknown) => done(error),
      );
    },
    _removeFile: (_request, _file, done) => done(null),
  };
  const limits = { ...smallForm, fileSize: largestFileBytes };
  const form = multer({ storage: engine, limits, defParamCharset: 'utf8' }).single('file');
  const read = new Promise<void>((done, fail) =>
    form(request, response, (error: unknown) => (error ? fail(error) : done())),
  );
  await read.catch(async (error: unknown) => {
    // The form's reader gives up at the first error; what had come is taken away before that is answered.
    await settled;
    // Where the line is torn nobody reads the answer; it only keeps that from counting as a failure of ours.
    throw request.complete ? error : new Problem('not-now', 'The connection fell away; nothing of the file was kept.');
  });
  const fields: Record<string, unknown> = { ...request.body };
  if (!file) throw new Problem('not-valid', 'The form holds no file.', { field: 'file' });
  return { file, fields };
}

/** Ends the stream with an error where the form's reader would only cut it short, so that storage drops what came. */
async function keepWhole(request: Request, stream: Readable, storage: Storage) {
  const breakOff = () => stream.destroy(new Error('the connection fell away'));
  stream.once('limit', () => stream.destroy(new multer.MulterError('LIMIT_FILE_SIZE', 'file')));
  request.once('aborted', breakOff);
  try {
    return await storage.keepOriginal(stream);
  } finally {
    request.off('aborted', breakOff);
  }
}

/** The name a person knows the file by, without folders and characters that cannot be shown. */
function plainName(name: string): string {
  const last = name.split(/[\\/]/).at(-1) ?? '';
  // eslint-disable-next-line no-control-regex -- control characters are what is taken out
  const shown = last.replace(/[\u0000-\u001f\u007f\u202a-\u202e\u2066-\u2069]/g, '').trim();
  return shown.slice(0, 200) || 'without a name';
}

/** Sends a stream to the end, or breaks the answer off where the reader went away. */
export async function sendStream(stream: Readable, response: Response): Promise<void> {
  await pipeline(stream, response).catch((error: unknown) => {
    if (!response.destroyed) throw error;
  });
}
