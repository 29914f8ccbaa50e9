import type { Request, Response } from 'express';
import { sent } from './route.ts';

type Picture = { readonly tag: string; readonly type: string; read(): Promise<Uint8Array> };

/**
 * Sends a picture whose bytes never change under its tag: the browser of the one who asked keeps it, nobody between, and
 * asks for it without its bytes once it is known. Who may see it was checked before, at this request too.
 */
export async function sendPicture(request: Request, response: Response, picture: Picture): Promise<typeof sent> {
  response.setHeader('Cache-Control', 'private, max-age=31536000, immutable');
  response.setHeader('ETag', `"${picture.tag}"`);
  if (request.get('if-none-match') === `"${picture.tag}"`) {
    response.status(304).end();
    return sent;
  }
  const bytes = await picture.read().catch((error: unknown) => {
    response.removeHeader('Cache-Control');
    response.removeHeader('ETag');
    throw error;
  });
  response.type(picture.type).send(Buffer.from(bytes));
  return sent;
}
