// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { IrreversibleDialog } from './irreversible-dialog.tsx';

afterEach(cleanup);

describe('a dialog for what cannot be undone', () => {
  it('opens its button only on the typed number and a reason, and hands the reason on', async () => {
    const onConfirm = vi.fn();
    render(
      <IrreversibleDialog
        open
        onOpenChange={() => {}}
        title="Withdraw calibration CAL-06?"
        reach="3 open cases, 41 lengths, 9 estimates turn stale."
        number="CAL-06"
        verb="Withdraw CAL-06"
        leave="Leave it in force"
        onConfirm={onConfirm}
      />,
    );
    const button = screen.getByRole<HTMLButtonElement>('button', { name: 'Withdraw CAL-06' });
    expect(button.disabled).toBe(true);
    await userEvent.type(screen.getByLabelText('Type its number to go on'), 'CAL-06');
    expect(button.disabled).toBe(true);
    await userEvent.type(screen.getByLabelText('Why'), 'Reference scale found out');
    await userEvent.click(button);
    expect(onConfirm).toHaveBeenCalledWith('Reference scale found out');
  });
});
