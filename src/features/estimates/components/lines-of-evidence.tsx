import { useRef, useState } from 'react';
import { useWidth } from '#src/ui/use-width.ts';
import { evidenceSentence, type EvidenceLine } from './evidence-line.ts';
import { LinesChart } from './lines-chart.tsx';
import { LinesTable } from './lines-table.tsx';

type LinesOfEvidenceProps = { rows: readonly EvidenceLine[] };

const usualWidthPx = 478;
const widestPx = 620;

/** The three lines of evidence on one axis of stress, or read as a table. */
export function LinesOfEvidence({ rows }: LinesOfEvidenceProps) {
  const frame = useRef<HTMLDivElement>(null);
  const width = Math.min(useWidth(frame, usualWidthPx), widestPx);
  const [asTable, setAsTable] = useState(false);
  return (
    <div ref={frame}>
      {asTable ? (
        <LinesTable rows={rows} />
      ) : (
        <div role="img" aria-label={evidenceSentence(rows)}>
          <LinesChart rows={rows} width={width} />
        </div>
      )}
      <p className="mt-1 text-right text-s" style={{ maxWidth: widestPx }}>
        <button type="button" className="button is-plain is-small" onClick={() => setAsTable(!asTable)}>
          {asTable ? 'Read as a drawing' : 'Read as a table'}
        </button>
      </p>
    </div>
  );
}
