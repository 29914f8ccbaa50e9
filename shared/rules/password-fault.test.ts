import { describe, expect, it } from 'vitest';
import { passwordFault } from './password-fault.ts';

const owner = { name: 'Ottoline Brask', mail: 'o.brask-lab@marrowdene.example' };

describe('a password its owner chooses', () => {
  it('is taken when it is long and speaks of nobody', () => {
    expect(passwordFault('hackle and mist', owner)).toBeNull();
  });

  it('is refused under twelve characters', () => {
    expect(passwordFault('eleven char', owner)).toMatch(/at least 12 characters; this one has 11/);
  });

  it('is refused when it holds the mail address or a part of the name, however written', () => {
    for (const password of ['my OTTOLINE and mist', 'brask brask mist', 'o.brask-lab@marrowdene.example']) {
      expect(passwordFault(password, owner)).toMatch(/name or mail address/);
    }
  });

  it('is refused when it repeats a few characters', () => {
    expect(passwordFault('abababababababab', owner)).toMatch(/different/);
  });

  it('counts a character of several code units as one', () => {
    expect(passwordFault('🙂🙃😀😁😂😃', owner)).toMatch(/this one has 6/);
  });
});
