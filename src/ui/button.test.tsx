// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { Button } from './button.tsx';

afterEach(cleanup);

describe('a button', () => {
  it('says beside it what would open it when it is closed', () => {
    render(<Button closedBecause="You wrote in this case, so another manager signs.">Sign the closure</Button>);
    const button = screen.getByRole<HTMLButtonElement>('button', { name: 'Sign the closure' });
    expect(button.disabled).toBe(true);
    const reason = document.getElementById(button.getAttribute('aria-describedby') ?? '');
    expect(reason?.textContent).toBe('You wrote in this case, so another manager signs.');
  });

  it('does not send a form unless it is told to', () => {
    render(<Button>Take 4.7</Button>);
    expect(screen.getByRole('button').getAttribute('type')).toBe('button');
  });
});
