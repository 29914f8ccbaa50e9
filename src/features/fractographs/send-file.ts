import { FractographView } from '#shared/contracts/fractographs.ts';
import { ProblemBody } from '#shared/contracts/problem.ts';
import { actHeaders } from '#src/http/api.ts';
import { sizeInWords } from './size-in-words.ts';

export type SendOutcome =
  | { readonly kind: 'here'; readonly figure: FractographView | null }
  | { readonly kind: 'failed'; readonly why: string };

/** Sends one file in a request of its own, telling how many bytes are through. Never rejects: a failure is an outcome. */
export function sendFile(path: string, file: File, onSent: (bytes: number) => void): Promise<SendOutcome> {
  return new Promise((settle) => {
    const request = new XMLHttpRequest();
    let sent = 0;
    request.upload.onprogress = ({ loaded }) => {
      // The form round the file adds some hundred bytes.
      sent = Math.min(loaded, file.size);
      onSent(sent);
    };
    request.onload = () => settle(outcomeOf(request));
    request.onerror = () =>
      settle({ kind: 'failed', why: `The connection fell away at ${sizeInWords(sent)} of ${sizeInWords(file.size)}.` });
    request.onabort = request.onerror;
    request.open('POST', path);
    for (const [name, value] of Object.entries(actHeaders(crypto.randomUUID()))) request.setRequestHeader(name, value);
    const form = new FormData();
    form.set('file', file, file.name);
    request.send(form);
  });
}

function outcomeOf(request: XMLHttpRequest): SendOutcome {
  const body = jsonOf(request.responseText);
  if (request.status === 202) return { kind: 'here', figure: FractographView.safeParse(body).data ?? null };
  const problem = ProblemBody.safeParse(body).data;
  if (problem?.code === 'already-done') return { kind: 'here', figure: null };
  return { kind: 'failed', why: problem?.message ?? 'The laboratory’s server did not answer.' };
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null; // a proxy's own page, which says nothing to us
  }
}
