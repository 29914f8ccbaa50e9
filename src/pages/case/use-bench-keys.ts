import type { KeyboardEvent } from 'react';
import type { Bench } from '#src/features/fractographs/bench/bench-store.ts';
import { readBenchKey, type BenchKey } from '#src/features/fractographs/bench/keys.ts';
import type { Move } from '#src/features/fractographs/bench/moves.ts';

/** True in what takes typing, where the letters and arrows of the bench are left alone. */
function isField(target: EventTarget): boolean {
  if (!(target instanceof HTMLElement)) return false;
  return target.isContentEditable || target.closest('input, textarea, select, [role="dialog"]') !== null;
}

type BenchKeys = {
  bench: Bench;
  letterKeys: boolean;
  /** Marks cannot be drawn here: keys that would are left alone. */
  closed: boolean;
  toFace: () => void;
  onOther: (key: Exclude<BenchKey, Move>) => void;
};

/**
 * The bench's answer to keys. Arrows, Enter and the like act only on the face itself, since the tray, the sliders and
 * the list have arrows of their own; letters act anywhere on the bench but in a field.
 */
export function useBenchKeys({ bench, letterKeys, closed, toFace, onOther }: BenchKeys) {
  return (event: KeyboardEvent<HTMLElement>): void => {
    const onFace = event.target instanceof HTMLElement && event.target.matches('[data-face]');
    const isLetter = event.key.length === 1 && event.key !== ' ';
    if (isField(event.target) || (!onFace && !isLetter && event.key !== 'Escape')) return;
    const key = readBenchKey(event, bench.state(), letterKeys);
    if (!key) return;
    if (closed && (key.kind === 'tool picked' || key.kind === 'remove selected' || key.kind === 'undo')) return;
    event.preventDefault();
    switch (key.kind) {
      case 'turn':
      case 'mating face':
      case 'together':
      case 'undo':
      case 'remove selected':
        return onOther(key);
      case 'tool picked':
        toFace();
        return bench.do(key);
      default:
        return bench.do(key);
    }
  };
}
