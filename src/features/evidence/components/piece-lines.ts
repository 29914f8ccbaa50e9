import type { z } from 'zod';
import type { PieceChange, PieceView } from '#shared/contracts/evidence.ts';
import { formatMass } from '#shared/wording/mass.ts';
import type { VersionLine } from './both-versions.tsx';
import { statusWords } from './piece-words.ts';

type Sent = z.input<typeof PieceChange>;

/** A piece as its form holds it: the answer about the origin is empty until one is chosen. */
export type PieceTyped = Sent;

export function typedPiece(piece: PieceView): PieceTyped {
  const { description, status, originLies, version } = piece;
  const isMissing = status === 'missing';
  return {
    description,
    status,
    originLies: originLies ?? '',
    version,
    mass: piece.mass ? (piece.mass.entered ?? formatMass(piece.mass)) : '',
    condition: piece.condition ?? '',
    receivedOn: piece.receivedOn ?? '',
    missingReason: piece.missingReason ?? '',
    place: isMissing ? '' : piece.place,
    holder: isMissing ? '' : piece.holder,
  };
}

/** What is sent of it: nothing about the origin unless the piece is not there. */
export function sentOf(typed: PieceTyped): Sent {
  return typed.status === 'missing' ? typed : { ...typed, originLies: null, missingReason: null };
}

/** Two versions of a piece, line by line. */
export function linesOfPiece(theirs: PieceTyped, mine: PieceTyped): VersionLine[] {
  const line = (word: string, read: (typed: PieceTyped) => string | null) => ({
    word,
    theirs: read(theirs),
    mine: read(mine),
  });
  const lines = [
    line('What it is', (typed) => typed.description),
    line('It is', (typed) => statusWords[typed.status]),
    line('Mass', (typed) => typed.mass),
    line('Where', (typed) => typed.place),
    line('With', (typed) => typed.holder),
    line('Condition', (typed) => typed.condition),
    line('Received on', (typed) => typed.receivedOn),
  ];
  if (theirs.status !== 'missing' && mine.status !== 'missing') return lines;
  return [
    ...lines,
    line('Why not there', (typed) => typed.missingReason),
    line('Origin on it', ({ originLies }) => originLies),
  ];
}
