import { Link } from 'react-router-dom';
import type { EstimateView, SourceNode } from '#shared/contracts/estimates.ts';
import { MarginNote } from '#src/ui/margin-note.tsx';
import { SetText } from './set-text.tsx';

/** Where an estimate comes from: each input, down to the calibration or the source of a constant. */
export function LineageTree({ estimate }: { estimate: EstimateView }) {
  return (
    <MarginNote title={`Where ${estimate.origin.text} comes from`}>
      <Branch nodes={estimate.sources} />
      <p className="mt-2 text-ink-3">
        Estimate {estimate.number}, {estimate.madeBy.name}
      </p>
    </MarginNote>
  );
}

function Branch({ nodes }: { nodes: readonly SourceNode[] }) {
  return (
    <ul className="lineage-tree">
      {nodes.map((node, index) => (
        <li key={index} className={node.stale ? 'text-iron' : undefined}>
          {node.href ? (
            <Link className="text-inherit decoration-rule" to={node.href}>
              <SetText text={node.words} />
            </Link>
          ) : (
            <SetText text={node.words} />
          )}
          {node.stale ? <span className="sr-only"> (stale)</span> : null}
          {node.from.length > 0 ? <Branch nodes={node.from} /> : null}
        </li>
      ))}
    </ul>
  );
}
