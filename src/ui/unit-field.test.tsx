// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { UnitField } from './unit-field.tsx';

afterEach(cleanup);

const wordsDescribing = (field: HTMLElement) =>
  (field.getAttribute('aria-describedby') ?? '')
    .split(' ')
    .map((id) => document.getElementById(id)?.textContent ?? '')
    .join(' | ');

describe('a field of a measured value', () => {
  it('ties its fault and its help to the field, the fault first', () => {
    render(
      <UnitField
        label="Length of the scale bar"
        unit="µm"
        entry={{ defaultValue: '0' }}
        error="A scale bar has a length above 0 µm."
        help="The image is kept without a scale until then."
      />,
    );
    const field = screen.getByLabelText('Length of the scale bar');
    expect(field.getAttribute('aria-invalid')).toBe('true');
    expect(wordsDescribing(field)).toBe(
      'A scale bar has a length above 0 µm. | The image is kept without a scale until then.',
    );
  });

  it('names ± after the value and keeps the typing of another unit', () => {
    render(
      <UnitField
        label="Thickness"
        unit="mm"
        entry={{ defaultValue: '2.979' }}
        plusMinus={{ defaultValue: '0.004' }}
        typedAs="0.1173 in"
      />,
    );
    expect(screen.getByLabelText<HTMLInputElement>('± of Thickness, in mm').value).toBe('0.004');
    expect(wordsDescribing(screen.getByLabelText('Thickness'))).toBe('typed as 0.1173 in');
    expect(screen.getByLabelText('Thickness').getAttribute('aria-invalid')).toBeNull();
  });
});
