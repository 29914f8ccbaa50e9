import { originLies } from '#shared/vocabulary/pieces.ts';
import { originWords } from './piece-words.ts';

/** The answers to "May the origin lie on it", none chosen beforehand. */
export function OriginOptions() {
  return (
    <>
      <option value="">choose an answer</option>
      {originLies.map((answer) => (
        <option key={answer} value={answer}>
          {originWords[answer]}
        </option>
      ))}
    </>
  );
}
