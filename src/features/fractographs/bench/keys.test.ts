import { describe, expect, it } from 'vitest';
import { benchState } from './bench-state.ts';
import { readBenchKey } from './keys.ts';

const state = benchState({ widthPx: 100, heightPx: 100 });
const press = (key: string, held: Partial<Record<'shiftKey' | 'ctrlKey' | 'metaKey' | 'altKey', boolean>> = {}) => ({
  key,
  shiftKey: false,
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  ...held,
});

describe('the keys of the bench', () => {
  it.each([
    ['o', 'origin'],
    ['f', 'flaw outline'],
    ['m', 'mirror'],
    ['i', 'mist'],
    ['h', 'hackle'],
    ['w', 'wallner line'],
    ['a', 'arrest line'],
    ['c', 'compression curl'],
    ['l', 'length'],
    ['n', 'note'],
  ])('%s picks %s', (key, tool) => {
    expect(readBenchKey(press(key), state, true)).toEqual({ kind: 'tool picked', tool });
  });

  it('aims by one px of screen, and by ten with Shift', () => {
    expect(readBenchKey(press('ArrowLeft'), state, true)).toEqual({ kind: 'aimed', by: { x: -1, y: 0 } });
    const withShift = readBenchKey(press('ArrowDown', { shiftKey: true }), state, true);
    expect(withShift).toEqual({ kind: 'aimed', by: { x: 0, y: 10 } });
  });

  it('undoes with Ctrl Z, and leaves the other keys with Ctrl to the browser', () => {
    expect(readBenchKey(press('z', { ctrlKey: true }), state, true)).toEqual({ kind: 'undo' });
    expect(readBenchKey(press('f', { ctrlKey: true }), state, true)).toBeNull();
  });

  it('leaves letters alone for who has turned them off, but not the arrows', () => {
    expect(readBenchKey(press('o'), state, false)).toBeNull();
    expect(readBenchKey(press('ArrowUp'), state, false)).not.toBeNull();
  });

  it('sets a point with Enter and leaves with Esc', () => {
    expect(readBenchKey(press('Enter'), state, true)).toEqual({ kind: 'set' });
    expect(readBenchKey(press('Escape'), state, true)).toEqual({ kind: 'left' });
  });
});
