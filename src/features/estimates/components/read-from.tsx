import { Link } from 'react-router-dom';
import type { InputView } from '#shared/contracts/estimates.ts';

/** Where an input was read: a mark on its figure, a record of a constant, or what was said when it was typed. */
export function ReadFrom({ input, caseNumber }: { input: InputView; caseNumber: string }) {
  const { source } = input;
  if (source.kind === 'measurement') {
    return (
      <Link className="is-quiet" to={`/cases/${caseNumber}/fractographs/${source.fractographId}`}>
        mark m{source.markNumber}, Fig. {source.figureNumber}
      </Link>
    );
  }
  if (source.kind === 'material constant') {
    return (
      <Link className="is-quiet" to={`/materials/${source.materialId}`}>
        {source.materialName}, record {source.recordNumber}
      </Link>
    );
  }
  return <span className="text-ink-2">{typedWords(input, source.note)}</span>;
}

/** What was typed, where it was typed in another unit, and what was said of it. */
function typedWords({ enteredText, enteredUnit, unit }: InputView, note: string): string {
  const typed = enteredUnit !== null && enteredUnit !== unit ? `typed as ${enteredText ?? ''}` : 'typed';
  return [note === '' || typed !== 'typed' ? typed : '', note].filter((words) => words !== '').join('; ');
}
