// @vitest-environment jsdom
import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { Dialog } from './dialog.tsx';

afterEach(cleanup);

function Opened() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <button onClick={() => setOpen(true)}>Bind a value</button>
      <Dialog open={open} onOpenChange={setOpen} title="Bind a value from the estimates" description="Into part 4.">
        <button onClick={() => setOpen(false)}>Leave without</button>
      </Dialog>
    </>
  );
}

describe('a dialog', () => {
  it('is named by its title and described by its first paragraph', async () => {
    render(<Opened />);
    await userEvent.click(screen.getByRole('button', { name: 'Bind a value' }));
    const dialog = screen.getByRole('dialog', { name: 'Bind a value from the estimates' });
    const described = document.getElementById(dialog.getAttribute('aria-describedby') ?? '');
    expect(described?.textContent).toBe('Into part 4.');
  });

  it('takes the focus and gives it back to the button it came from', async () => {
    render(<Opened />);
    const opener = screen.getByRole('button', { name: 'Bind a value' });
    await userEvent.click(opener);
    expect(screen.getByRole('dialog').contains(document.activeElement)).toBe(true);
    await userEvent.keyboard('{Escape}');
    expect(screen.queryByRole('dialog')).toBeNull();
    await waitFor(() => expect(document.activeElement).toBe(opener));
  });

  it('adds no style element, which the content policy would refuse', async () => {
    const before = document.querySelectorAll('style').length;
    render(<Opened />);
    await userEvent.click(screen.getByRole('button', { name: 'Bind a value' }));
    expect(document.querySelectorAll('style')).toHaveLength(before);
  });
});
