import type { Readable } from 'node:stream';

/** The one way to bytes. Nothing outside this room knows a path or a key. */
export type Storage = {
  /** Writes a stream away while hashing it; the same bytes are kept once. A stream that fails leaves nothing. */
  keepOriginal(stream: Readable): Promise<{ sha256: string; bytes: number }>;
  /** @throws when no such original is kept. */
  readOriginal(sha256: string): Promise<Readable>;
  /** A local file with the original's bytes, for a decoder that needs one; read-only. */
  originalFile(sha256: string): Promise<string>;
  /** Takes away the bytes of a refused file, with what was derived from them. */
  dropOriginal(sha256: string): Promise<void>;
  /** Bytes derived from an original (tiles, previews), which can be made again; `name` like `tiles/3/0_1.webp`. */
  keepDerived(sha256: string, name: string, bytes: Uint8Array): Promise<void>;
  readDerived(sha256: string, name: string): Promise<Uint8Array | null>;
  /** An empty local folder to make many derived files in; the maker hands it to `keepDerivedFolder` or removes it. */
  workFolder(): Promise<string>;
  /** Takes what stands in a work folder as derived from an original, in place of what was there; the folder goes. */
  keepDerivedFolder(sha256: string, folder: string): Promise<void>;
  /** Removes a work folder that came to nothing. */
  dropWorkFolder(folder: string): Promise<void>;
};
