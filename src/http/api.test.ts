// @vitest-environment jsdom
import { act, cleanup, renderHook } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { keepSession, read, send } from './api.ts';
import { useSessionEnded } from './session-ended.ts';

const person = {
  id: '0198e6a0-0000-7000-8000-000000000001',
  name: 'Ana Lyst',
  mail: 'ana@test.example',
  organisationId: '0198e6a0-0000-7000-8000-000000000002',
  organisationName: 'Test Laboratory',
  organisationKind: 'laboratory' as const,
  roles: ['analyst' as const],
};
const settings = { theme: 'paper' as const, roomyRows: false, letterKeys: true };
const signedIn = (requestToken: string) => ({ person, settings, requestToken });
const refusal = (code: string) => ({ code, message: 'refused' });

type Sent = { path: string; token: string | null; actId: string | null };
let sent: Sent[] = [];
let answers: { status: number; body: unknown }[] = [];

beforeEach(() => {
  sent = [];
  answers = [];
  keepSession(signedIn('old token'));
  vi.stubGlobal('fetch', (path: string, request: RequestInit) => {
    const headers = new Headers(request.headers);
    sent.push({ path, token: headers.get('x-request-token'), actId: headers.get('x-act-id') });
    const { status, body } = answers.shift() ?? { status: 500, body: refusal('unexpected') };
    return Promise.resolve(new Response(JSON.stringify(body), { status }));
  });
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

describe('an act sent after the session has ended', () => {
  it('waits for the same person to sign in again and goes on under its own id, with the new token', async () => {
    const page = renderHook(() => useSessionEnded());
    answers = [
      { status: 403, body: refusal('forged-request') },
      { status: 200, body: { person: null, settings: null, requestToken: 'a visitor’s' } },
      { status: 200, body: { kept: true } },
    ];
    const done = send('POST', '/marks', { drawn: 'here' }, z.object({ kept: z.boolean() }));
    await vi.waitFor(() => expect(page.result.current.ended).toBe(true));
    keepSession(signedIn('new token'));
    act(() => page.result.current.goOn());
    expect(await done).toEqual({ kept: true });
    expect(page.result.current.ended).toBe(false);
    const [first, , again] = sent;
    expect(again).toEqual({ ...first, token: 'new token' });
  });

  it('is refused when the person would not sign in', async () => {
    const page = renderHook(() => useSessionEnded());
    answers = [{ status: 401, body: refusal('not-signed-in') }];
    const done = read('/me', z.unknown()).catch((error: unknown) => error);
    await vi.waitFor(() => expect(page.result.current.ended).toBe(true));
    act(() => page.result.current.giveUp());
    expect(await done).toMatchObject({ body: { code: 'not-signed-in' } });
  });

  it('is refused at once where no page stands behind the sign-in', async () => {
    answers = [{ status: 401, body: refusal('not-signed-in') }];
    await expect(read('/me', z.unknown())).rejects.toMatchObject({ body: { code: 'not-signed-in' } });
  });

  it('goes on by itself when the same person has a new session from another page', async () => {
    answers = [
      { status: 403, body: refusal('forged-request') },
      { status: 200, body: signedIn('token of the other page') },
      { status: 200, body: null },
    ];
    await send('POST', '/marks', {}, z.null());
    expect(sent.at(-1)?.token).toBe('token of the other page');
  });

  it('is never done in the name of someone else who has signed in meanwhile', async () => {
    const other = { ...person, id: '0198e6a0-0000-7000-8000-000000000009', name: 'Someone Else' };
    answers = [
      { status: 403, body: refusal('forged-request') },
      { status: 200, body: { ...signedIn('their token'), person: other } },
    ];
    await expect(send('POST', '/marks', {}, z.null())).rejects.toMatchObject({ body: { code: 'forged-request' } });
    expect(sent).toHaveLength(2);
  });
});
