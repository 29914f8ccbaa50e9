import type { PartView, PieceView } from '#shared/contracts/evidence.ts';
import { massParts } from '#shared/wording/mass.ts';
import { PieceGlyph } from '#src/ui/glyphs/piece-glyph.tsx';
import { Quantity } from '#src/ui/quantity.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { depthOf, remarkOf, shapeOf, type Remark } from './piece-words.ts';

type PiecesTableProps = {
  parts: readonly PartView[];
  pieces: readonly PieceView[];
  /** Opens a piece to change it; absent where the pieces may not be changed. */
  onOpen?: (piece: PieceView) => void;
  openId: string | null;
};

const toneClass: Readonly<Record<Remark['tone'], string>> = {
  'ink-2': 'text-ink-2',
  iron: 'text-iron',
  ochre: 'text-ochre',
};

/** Every piece under its part: what it is, its mass, where it is and with whom. */
export function PiecesTable({ parts, pieces, onOpen, openId }: PiecesTableProps) {
  return (
    <Table caption="Pieces" stacked>
      <thead>
        <tr>
          <Th>Piece</Th>
          <Th>What it is</Th>
          <Th numeric>Mass</Th>
          <Th>Where</Th>
          <Th>With</Th>
          <Th hidden>Margin</Th>
        </tr>
      </thead>
      <tbody>
        {parts.flatMap((part) => {
          const own = pieces.filter((piece) => piece.partId === part.id);
          return [
            <PartRow key={part.id} part={part} pieces={own} />,
            ...own.map((piece) => (
              <PieceRow
                key={piece.id}
                piece={piece}
                depth={depthOf(piece, own)}
                isOpen={piece.id === openId}
                onOpen={onOpen}
              />
            )),
          ];
        })}
      </tbody>
    </Table>
  );
}

function PartRow({ part, pieces }: { part: PartView; pieces: readonly PieceView[] }) {
  const received = pieces.filter((piece) => piece.parentId === null && piece.status !== 'missing').length;
  return (
    <tr className="font-semibold">
      <td className="whitespace-nowrap">
        <span className="inline-flex items-center gap-2 align-middle">
          <PieceGlyph piece="part" />
          part
        </span>
      </td>
      <td className="is-wide" colSpan={4}>
        {part.description}, {received === 1 ? '1 piece' : `${received} pieces`} received
      </td>
      <td className="text-s font-normal whitespace-nowrap text-ink-2">{part.serial ? `serial ${part.serial}` : ''}</td>
    </tr>
  );
}

type PieceRowProps = { piece: PieceView; depth: number; isOpen: boolean; onOpen?: (piece: PieceView) => void };

function PieceRow({ piece, depth, isOpen, onOpen }: PieceRowProps) {
  const remark = remarkOf(piece);
  const isMissing = piece.status === 'missing';
  const mass = piece.mass ? massParts(piece.mass) : null;
  return (
    <tr aria-selected={isOpen || undefined}>
      <td className="whitespace-nowrap">
        <span className={`inline-flex items-center gap-2 align-middle ${isOpen ? '-ml-[9px] narrow:ml-0' : ''}`}>
          <Branch depth={depth} />
          <PieceGlyph piece={shapeOf(piece)} />
          <span className="mono">{onOpen ? <OpenCode piece={piece} onOpen={onOpen} /> : piece.code}</span>
        </span>
      </td>
      <td className="is-wide">{piece.description}</td>
      <td className="num is-corner">
        {mass ? <Quantity {...mass} /> : <span className="whitespace-nowrap text-ink-3">not weighed</span>}
      </td>
      <td className={isMissing ? 'text-ink-3' : undefined} data-word={isMissing ? undefined : 'at'}>
        {piece.place}
      </td>
      <td className={isMissing ? 'is-end text-ink-3' : 'is-end'} data-word={isMissing ? undefined : 'with'}>
        {piece.holder}
      </td>
      <td className={`is-wide text-s ${remark ? toneClass[remark.tone] : ''}`}>{remark?.words}</td>
    </tr>
  );
}

function OpenCode({ piece, onOpen }: { piece: PieceView; onOpen: (piece: PieceView) => void }) {
  return (
    <button
      type="button"
      className="text-cobalt underline underline-offset-[3px]"
      aria-label={`Change ${piece.code}`}
      onClick={() => onOpen(piece)}
    >
      {piece.code}
    </button>
  );
}

/** The lines that lead from a part, or a piece, to what came of it. */
function Branch({ depth }: { depth: number }) {
  return (
    <span aria-hidden className="inline-flex self-stretch">
      {Array.from({ length: depth }, (_, level) => (
        <i key={level} className="relative block w-[16px]">
          {level === depth - 1 ? (
            <i className="absolute top-[-10px] left-[7px] h-[21px] w-[9px] border-b border-l border-rule" />
          ) : null}
        </i>
      ))}
    </span>
  );
}
