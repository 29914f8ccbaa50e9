import { LineGlyph } from '#src/ui/glyphs/line-glyph.tsx';
import { GlyphWord } from '#src/ui/glyph-word.tsx';
import { Quantity } from '#src/ui/quantity.tsx';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';
import { reckonedLines, stressParts, type EvidenceLine } from './evidence-line.ts';

/** The lines of evidence as a table: line, what it was read from, stress ± U at k = 2. */
export function LinesTable({ rows }: { rows: readonly EvidenceLine[] }) {
  return (
    <Table caption="Stress at the origin by line of evidence, with U at k = 2">
      <thead>
        <tr>
          <Th>Line</Th>
          <Th>Read from</Th>
          <Th numeric>
            Stress ± <var>U</var>, <var>k</var> = 2
          </Th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row, index) => (
          <tr key={index}>
            <th scope="row">
              <GlyphWord glyph={<LineGlyph line={row.line} hollow={row.stale} />}>{row.label}</GlyphWord>
            </th>
            <td>
              {row.sublabel}
              {row.stale ? <span className="text-iron">, stale</span> : null}
              {row.setAside ? ', set aside' : null}
            </td>
            <td className="num">
              <Stress row={row} />
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function Stress({ row }: { row: EvidenceLine }) {
  const [reckoned] = reckonedLines([row]);
  if (!reckoned) return <span className="text-ink-3">not reckoned</span>;
  return <Quantity {...stressParts(reckoned)} stale={row.stale} />;
}
