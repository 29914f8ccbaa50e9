// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Table } from './table.tsx';
import { Th } from './th.tsx';

afterEach(cleanup);

function Cases({ onSort }: { onSort?: () => void }) {
  return (
    <Table caption="Cases" stacked>
      <thead>
        <tr>
          <Th sorted="descending" onSort={onSort}>
            Case
          </Th>
          <Th hidden>Margin: what is stale</Th>
        </tr>
      </thead>
      <tbody>
        {['HB-2026-0002', 'HB-2026-0001'].map((number) => (
          <tr key={number}>
            <td>
              <a href={`/cases/${number}`}>{number}</a>
            </td>
            <td />
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

describe('a table', () => {
  it('says by which column it is sorted, and sorts from its head', async () => {
    const onSort = vi.fn();
    render(<Cases onSort={onSort} />);
    expect(screen.getByRole('columnheader', { name: 'Case' }).getAttribute('aria-sort')).toBe('descending');
    await userEvent.click(screen.getByRole('button', { name: 'Case' }));
    expect(onSort).toHaveBeenCalledOnce();
  });

  it('names itself and its margin column for a screen reader', () => {
    render(<Cases />);
    expect(screen.getByRole('table', { name: 'Cases' })).toBeTruthy();
    expect(screen.getByRole('columnheader', { name: 'Margin: what is stale' })).toBeTruthy();
  });

  it('moves by row with the arrows', async () => {
    render(<Cases />);
    screen.getByRole('link', { name: 'HB-2026-0002' }).focus();
    await userEvent.keyboard('{ArrowDown}');
    expect(document.activeElement?.textContent).toBe('HB-2026-0001');
    await userEvent.keyboard('{Home}');
    expect(document.activeElement?.textContent).toBe('HB-2026-0002');
  });
});
