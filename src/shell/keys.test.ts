// @vitest-environment jsdom
import { describe, expect, it } from 'vitest';
import { isTyping, readKey } from './keys.ts';

const pressed = (key: string, held: { ctrlKey?: boolean } = {}) => ({
  key,
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  ...held,
});

describe('the keys that work anywhere', () => {
  it('find with a stroke, list with a question mark, and go with G and a letter', () => {
    expect(readKey(pressed('/'), false)).toEqual({ kind: 'find' });
    expect(readKey(pressed('?'), false)).toEqual({ kind: 'list keys' });
    expect(readKey(pressed('g'), false)).toEqual({ kind: 'await place' });
    expect(readKey(pressed('L'), true)).toEqual({ kind: 'go', letter: 'l' });
  });

  it('leave single letters and held combinations to others', () => {
    expect(readKey(pressed('l'), false)).toBeNull();
    expect(readKey(pressed('g', { ctrlKey: true }), false)).toBeNull();
  });

  it('are off in fields, in dialogs, and where a surface has keys of its own', () => {
    document.body.innerHTML = '<input id="f" /><div data-own-keys><button id="b"></button></div><p id="p"></p>';
    expect(isTyping(document.getElementById('f'))).toBe(true);
    expect(isTyping(document.getElementById('b'))).toBe(true);
    expect(isTyping(document.getElementById('p'))).toBe(false);
  });
});
