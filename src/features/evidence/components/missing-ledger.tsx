import type { PieceView } from '#shared/contracts/evidence.ts';
import { limitSentence } from '#shared/wording/limit-sentence.ts';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { PieceGlyph } from '#src/ui/glyphs/piece-glyph.tsx';
import { RuleHead } from '#src/ui/rule-head.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';

/** The pieces that are not there, why, and whether the origin may lie on them. */
export function MissingLedger({ pieces }: { pieces: readonly PieceView[] }) {
  const missing = pieces.filter((piece) => piece.status === 'missing');
  return (
    <div className="mb-5">
      <RuleHead small>What is not there</RuleHead>
      {missing.length === 0 ? (
        <p className="mt-2 text-ink-2">No piece is noted as missing.</p>
      ) : (
        <Table caption="What is not there" stacked>
          <thead>
            <tr>
              <Th>Piece</Th>
              <Th>What it is, and the search</Th>
              <Th>May the origin lie on it</Th>
            </tr>
          </thead>
          <tbody>
            {missing.map((piece) => (
              <MissingRow key={piece.id} piece={piece} />
            ))}
          </tbody>
        </Table>
      )}
    </div>
  );
}

function MissingRow({ piece }: { piece: PieceView }) {
  const { code, description, missingReason, originLies } = piece;
  const limit = missingReason && originLies ? limitSentence({ code, description, missingReason, originLies }) : null;
  return (
    <tr>
      <td>
        <GlyphWord glyph={<PieceGlyph piece="missing" />}>
          <b>{code}</b>
        </GlyphWord>
      </td>
      <td className="is-wide py-2 narrow:!py-0">
        {description}; {missingReason}
      </td>
      <td className="is-wide py-2 narrow:!py-0" data-word="Origin on it:">
        <b className={limit ? 'text-iron' : 'font-normal'}>{originLies}</b>
        {limit ? <span className="text-ink-2">, a limit stands in the findings</span> : null}
      </td>
    </tr>
  );
}
