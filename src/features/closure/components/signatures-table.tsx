import type { ReviewView, SignatureView } from '#shared/contracts/closure.ts';
import { formatInstantIn } from '#shared/wording/instant-in-zone.ts';
import { meaningWords } from '#shared/wording/signature-meaning.ts';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { ListedGlyph } from '#src/ui/glyphs/listed-glyph.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';

const doneWords = { authored: 'Authored', checked: 'Checked', approved: 'Approved' } as const;

/** Who signed, what the signature says, when and in which zone; and whether it was given to what stands here. */
export function SignaturesTable({ review }: { review: Pick<ReviewView, 'signatures' | 'contentHash'> }) {
  const { signatures, contentHash } = review;
  if (signatures.length === 0) return <p className="mt-3 text-ink-2">No one has signed yet.</p>;
  return (
    <Table caption="Signatures" stacked>
      <thead>
        <tr>
          <Th>Signed as</Th>
          <Th>By</Th>
          <Th>When</Th>
        </tr>
      </thead>
      <tbody>
        {signatures.map((signature) => (
          <tr key={signature.id}>
            <th scope="row" className="py-2!">
              {doneWords[signature.meaning]}
              <span className="block text-s font-normal text-ink-2">{meaningWords[signature.meaning]}</span>
            </th>
            <td>
              <b>{signature.printedName}</b>
              {contentHash !== null && !signature.matches ? <GivenToOther signature={signature} /> : null}
            </td>
            <td className="is-wide text-ink-2">{formatInstantIn(signature.signedAt, signature.zone)}</td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function GivenToOther({ signature: { round } }: { signature: SignatureView }) {
  return (
    <GlyphWord glyph={<ListedGlyph listed="changed" />} className="mt-1 flex text-s text-iron">
      in round {round}, to other content than stands here
    </GlyphWord>
  );
}
