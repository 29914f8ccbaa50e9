import { Caution } from '#src/ui/caution.tsx';
import { cautionsFor } from '../cautions.ts';

/** Care at receipt, as the case's own words call for. */
export function Cautions({ words }: { words: string }) {
  return (
    <Caution>
      {cautionsFor(words).map(({ lead, words: text }) => (
        <span key={lead}>
          <b>{lead}</b> {text}{' '}
        </span>
      ))}
    </Caution>
  );
}
