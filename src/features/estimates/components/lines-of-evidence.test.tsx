// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { evidenceSentence, sharedStressesMPa, type EvidenceLine } from './evidence-line.ts';
import { LinesOfEvidence } from './lines-of-evidence.tsx';
import { stressAxis } from './stress-axis.ts';

afterEach(cleanup);

const rows: EvidenceLine[] = [
  { line: 'load', label: 'Load', sublabel: 'bend, 40/20 mm', value: 378, expandedUncertainty: 8 },
  { line: 'mirror', label: 'Mirror', sublabel: 'm3, Fig. 2', value: 369, expandedUncertainty: 27 },
  { line: 'flaw', label: 'Flaw', sublabel: 'm2', value: 391, expandedUncertainty: 36, stale: true },
];

describe('the lines of evidence', () => {
  it('say in one sentence each stress with ± and unit, and what they share', () => {
    render(<LinesOfEvidence rows={rows} />);
    const sentence = screen.getByRole('img').getAttribute('aria-label');
    expect(sentence).toContain('Load 378 ± 8 MPa; Mirror 369 ± 27 MPa; Flaw 391 ± 36 MPa (stale)');
    expect(sentence).toContain('shared by all three, 370 to 386');
  });

  it('can be read as a table instead', async () => {
    render(<LinesOfEvidence rows={rows} />);
    await userEvent.click(screen.getByRole('button', { name: 'Read as a table' }));
    expect(screen.queryByRole('img')).toBeNull();
    expect(screen.getByRole('rowheader', { name: 'Mirror' })).toBeTruthy();
    expect(screen.getByText('m2').closest('td')?.textContent).toBe('m2, stale');
  });

  it('leave a line that is set aside out of what is shared', () => {
    const aside = rows.map((row) => ({ ...row, setAside: row.line === 'load' }));
    expect(sharedStressesMPa(aside)).toEqual({ from: 355, to: 396 });
    expect(evidenceSentence(aside)).toContain('shared by both, 355 to 396');
  });

  it('say so where no stress lies in every interval, and where a line is not reckoned', () => {
    const apart: EvidenceLine[] = [
      { line: 'load', label: 'Load', sublabel: '', value: 300, expandedUncertainty: 8 },
      { line: 'mirror', label: 'Mirror', sublabel: '', value: 369, expandedUncertainty: 27 },
      { line: 'flaw', label: 'Flaw', sublabel: '', value: null, expandedUncertainty: 0 },
    ];
    expect(evidenceSentence(apart)).toContain('Flaw not reckoned');
    expect(evidenceSentence(apart)).toContain('no stress is shared by both');
  });
});

describe('the axis of stress', () => {
  it('holds every interval between round numbers', () => {
    expect(stressAxis([342, 427])).toMatchObject({ from: 320, to: 440, major: [320, 360, 400, 440] });
  });

  it('stands even with nothing, or one stress, to hold', () => {
    expect(stressAxis([]).major.length).toBeGreaterThan(2);
    expect(stressAxis([0, 0]).to).toBeGreaterThanOrEqual(0);
  });
});
