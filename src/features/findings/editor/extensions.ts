import type { Extensions } from '@tiptap/core';
import Collaboration from '@tiptap/extension-collaboration';
import CollaborationCaret from '@tiptap/extension-collaboration-caret';
import { TableKit } from '@tiptap/extension-table';
import StarterKit from '@tiptap/starter-kit';
import type { FindingsText } from '#src/collaboration/findings-text.ts';
import { BoundValue } from './bound-value-node.tsx';
import { Figure } from './figure-node.tsx';
import { StaleMargin, type StaleMarginStore } from './stale-margin.ts';

type FindingsParts = {
  readonly number: string;
  readonly text: FindingsText;
  readonly margin: StaleMarginStore;
  /** Which of the colours of others a person has on this page: 0, 1, 2. */
  readonly toneOf: (personId: string) => number;
  readonly onBind: () => void;
};

/** What findings are written with. Undo is the shared text's own: it takes back only what this person did. */
export function findingsExtensions({ number, text, margin, toneOf, onBind }: FindingsParts): Extensions {
  return [
    StarterKit.configure({
      undoRedo: false,
      heading: { levels: [2, 3] },
      codeBlock: false,
      link: false,
      trailingNode: false,
    }),
    TableKit.configure({ table: { resizable: false } }),
    Collaboration.configure({ document: text.doc }),
    CollaborationCaret.configure({
      provider: text.provider,
      user: text.user,
      render: (user) => caretOf(String(user.name), toneOf(String(user.id))),
      selectionRender: (user) => ({ class: `findings-chosen is-other-${toneOf(String(user.id))}` }),
    }),
    BoundValue.configure({ number, onBind }),
    Figure.configure({ number }),
    StaleMargin.configure({ store: margin }),
  ];
}

function caretOf(name: string, tone: number): HTMLElement {
  const caret = document.createElement('span');
  caret.className = `findings-caret is-other-${tone}`;
  const flag = document.createElement('span');
  flag.className = 'findings-caret-name';
  flag.textContent = firstName(name);
  caret.append(flag);
  return caret;
}

export const firstName = (name: string) => name.split(' ')[0] ?? name;
