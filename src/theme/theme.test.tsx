// @vitest-environment jsdom
import { act, cleanup, renderHook } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { onBookThemeChosen, takeBookTheme, useBenchPlace, useTheme } from './theme.ts';

const inBenchLight = () => document.documentElement.classList.contains('bench-light');

beforeEach(() => localStorage.clear());
afterEach(cleanup);

describe('the theme', () => {
  it('is kept on this machine and reported when the person picks it', () => {
    const onChosen = vi.fn();
    const { result } = renderHook(() => useTheme(onChosen));
    act(() => result.current.setTheme('bench light'));
    expect(result.current.theme).toBe('bench light');
    expect(localStorage.getItem('hb-theme')).toBe('bench light');
    expect(onChosen).toHaveBeenCalledWith('bench light');
    expect(inBenchLight()).toBe(true);
  });

  it('opens the bench in bench light and gives the book its own back', () => {
    const { unmount } = renderHook(() => useBenchPlace());
    expect(inBenchLight()).toBe(true);
    unmount();
    expect(inBenchLight()).toBe(false);
  });

  it('is taken from the person’s settings at the sign-in, and what they choose for the book is heard, the bench’s is not', () => {
    const hear = vi.fn();
    const stop = onBookThemeChosen(hear);
    const { result } = renderHook(() => useTheme());
    act(() => takeBookTheme('bench light'));
    expect(inBenchLight()).toBe(true);
    expect(hear).not.toHaveBeenCalled();
    act(() => result.current.setTheme('paper'));
    const bench = renderHook(() => useBenchPlace());
    act(() => result.current.setTheme('paper'));
    bench.unmount();
    stop();
    expect(hear.mock.calls).toEqual([['paper']]);
  });
});
