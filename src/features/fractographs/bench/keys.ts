import { markKinds, markKindTable } from '#shared/vocabulary/mark-kinds.ts';
import type { BenchState } from './bench-state.ts';
import type { Move } from './moves.ts';

export type KeyPressed = {
  readonly key: string;
  readonly shiftKey: boolean;
  readonly ctrlKey: boolean;
  readonly metaKey: boolean;
  readonly altKey: boolean;
};

/** What a key asks for: a move of this bench, or something beyond it. */
export type BenchKey =
  | Move
  | { readonly kind: 'turn'; readonly by: 1 | -1 }
  | { readonly kind: 'mating face' }
  | { readonly kind: 'together' }
  | { readonly kind: 'remove selected' }
  | { readonly kind: 'undo' };

const arrows: Readonly<Record<string, { x: number; y: number }>> = {
  ArrowLeft: { x: -1, y: 0 },
  ArrowRight: { x: 1, y: 0 },
  ArrowUp: { x: 0, y: -1 },
  ArrowDown: { x: 0, y: 1 },
};
const shiftStep = 10;
const zoomStep = 1.25;

/** Reads one key on the bench. Letters act only where the person has left them on. */
export function readBenchKey(pressed: KeyPressed, state: BenchState, letterKeys: boolean): BenchKey | null {
  if (pressed.ctrlKey || pressed.metaKey) return isUndo(pressed) ? { kind: 'undo' } : null;
  if (pressed.altKey) return null;
  const arrow = arrows[pressed.key];
  if (arrow) {
    const size = pressed.shiftKey ? shiftStep : 1;
    return { kind: 'aimed', by: { x: arrow.x * size, y: arrow.y * size } };
  }
  return readAct(pressed.key, state) ?? (letterKeys ? readLetter(pressed.key, state) : null);
}

const isUndo = ({ key, shiftKey, altKey }: KeyPressed) => key.toLowerCase() === 'z' && !shiftKey && !altKey;

function readAct(key: string, state: BenchState): BenchKey | null {
  switch (key) {
    case 'Enter':
      return { kind: 'set' };
    case 'Backspace':
      return state.points.length > 0 ? { kind: 'taken back' } : null;
    case 'Delete':
      return state.selectedId ? { kind: 'remove selected' } : null;
    case 'Escape':
      return { kind: 'left' };
    default:
      return null;
  }
}

function readLetter(key: string, state: BenchState): BenchKey | null {
  const { brightness, contrast, inverted } = state.light;
  switch (key.toLowerCase()) {
    case '+':
    case '=':
      return { kind: 'zoomed', factor: zoomStep };
    case '-':
      return { kind: 'zoomed', factor: 1 / zoomStep };
    case '0':
      return { kind: 'fitted' };
    case 'j':
      return { kind: 'turn', by: 1 };
    case 'k':
      return { kind: 'turn', by: -1 };
    case 'b':
      return { kind: 'mating face' };
    case 't':
      return { kind: 'together' };
    case 'v':
      return { kind: 'lit', light: { inverted: !inverted } };
    case '[':
      return { kind: 'lit', light: { brightness: brightness - 4 } };
    case ']':
      return { kind: 'lit', light: { brightness: brightness + 4 } };
    case '{':
      return { kind: 'lit', light: { contrast: contrast - 0.1 } };
    case '}':
      return { kind: 'lit', light: { contrast: contrast + 0.1 } };
    default:
      return readTool(key.toLowerCase());
  }
}

function readTool(letter: string): BenchKey | null {
  const kind = markKinds.find((each) => markKindTable[each].key === letter);
  return kind ? { kind: 'tool picked', tool: kind } : null;
}
