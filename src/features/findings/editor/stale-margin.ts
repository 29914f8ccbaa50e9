import { Extension } from '@tiptap/core';
import type { Node } from '@tiptap/pm/model';
import { Plugin, PluginKey, type EditorState } from '@tiptap/pm/state';
import { Decoration, DecorationSet, type EditorView } from '@tiptap/pm/view';

// Beside each block of the text that holds something stale stands a place for a note; the page draws the notes into
// these places. On a narrow screen the place comes after the block, so that the note falls under what it speaks of.

export type StalePlace = {
  readonly key: string;
  readonly valueIds: readonly string[];
  readonly figureIds: readonly string[];
  readonly host: HTMLElement;
};

/** The places for notes, as the page reads them. */
export class StaleMarginStore {
  #places: readonly StalePlace[] = [];
  readonly #hosts = new Map<string, HTMLElement>();
  readonly #listeners = new Set<() => void>();
  stale: ReadonlySet<string> = new Set();
  isNarrow = false;

  readonly subscribe = (tell: () => void): (() => void) => {
    this.#listeners.add(tell);
    return () => this.#listeners.delete(tell);
  };
  readonly places = (): readonly StalePlace[] => this.#places;

  hostOf(key: string): HTMLElement {
    const found = this.#hosts.get(key);
    if (found) return found;
    const host = document.createElement('div');
    host.className = 'findings-notes';
    host.contentEditable = 'false';
    this.#hosts.set(key, host);
    return host;
  }

  show(places: readonly StalePlace[]): void {
    const said = (each: readonly StalePlace[]) => each.map(({ key }) => key).join('|');
    if (said(places) === said(this.#places)) return;
    this.#places = places;
    for (const tell of this.#listeners) tell();
  }
}

type Drawn = { readonly decorations: DecorationSet; readonly places: readonly StalePlace[] };
const key = new PluginKey<Drawn>('staleMargin');

export const StaleMargin = Extension.create<{ store: StaleMarginStore }>({
  name: 'staleMargin',
  addOptions: () => ({ store: new StaleMarginStore() }),
  addProseMirrorPlugins() {
    const { store } = this.options;
    return [
      new Plugin<Drawn>({
        key,
        state: {
          init: (_, state) => draw(state, store),
          apply: (tr, drawn, _, state) => (tr.docChanged || tr.getMeta(key) ? draw(state, store) : drawn),
        },
        props: { decorations: (state) => key.getState(state)?.decorations },
        view: () => ({
          update: (view) => {
            store.show(key.getState(view.state)?.places ?? []);
            keepNotesApart(view);
          },
        }),
      }),
    ];
  },
});

/** Tells the text which values and figures are stale now, and whether the screen is narrow. */
export function markStale(view: EditorView, store: StaleMarginStore, stale: ReadonlySet<string>, isNarrow: boolean) {
  store.stale = stale;
  store.isNarrow = isNarrow;
  view.dispatch(view.state.tr.setMeta(key, true).setMeta('addToHistory', false));
}

/** Notes of neighbouring blocks stand under one another, never over, and the sheet grows to hold the last of them. */
export function keepNotesApart(view: EditorView): void {
  requestAnimationFrame(() => {
    let least = 0;
    let isBeside = false;
    for (const host of view.dom.querySelectorAll<HTMLElement>(':scope > .findings-notes')) {
      host.style.marginTop = '';
      const { top, height } = host.getBoundingClientRect();
      isBeside = getComputedStyle(host).position === 'absolute';
      if (isBeside && top < least) host.style.marginTop = `${least - top}px`;
      least = host.getBoundingClientRect().top + height + 10;
    }
    const sheet = view.dom.parentElement;
    if (sheet) sheet.style.minHeight = isBeside ? `${least - sheet.getBoundingClientRect().top}px` : '';
  });
}

function draw(state: EditorState, store: StaleMarginStore): Drawn {
  const decorations: Decoration[] = [];
  const places: StalePlace[] = [];
  state.doc.forEach((block, at) => {
    const found = staleIn(block, at, store.stale);
    if (found.valueIds.length + found.figureIds.length === 0) return;
    const name = [...found.valueIds, ...found.figureIds].join(' ');
    const host = store.hostOf(name);
    places.push({ key: name, ...found, host });
    decorations.push(
      Decoration.widget(store.isNarrow ? at + block.nodeSize : at, host, {
        key: `${name} ${store.isNarrow}`,
        side: -1,
        ignoreSelection: true,
        stopEvent: () => true,
      }),
      ...found.sentences.map(([from, to]) => Decoration.inline(from, to, { class: 'stale-sentence' })),
    );
  });
  return { decorations: DecorationSet.create(state.doc, decorations), places };
}

function staleIn(block: Node, at: number, stale: ReadonlySet<string>) {
  const valueIds = new Set<string>();
  const figureIds = new Set<string>();
  const sentences: [number, number][] = [];
  const look = (node: Node, place: number) => {
    const figureId = String(node.attrs.figureId ?? '');
    const valueId = String(node.attrs.bindingId ?? '');
    if (node.type.name === 'figure' && stale.has(figureId)) figureIds.add(figureId);
    if (node.type.name === 'boundValue' && stale.has(valueId)) valueIds.add(valueId);
    if (node.isTextblock) sentences.push(...staleSentences(node, place, stale));
  };
  look(block, at);
  block.descendants((node, offset) => look(node, at + 1 + offset));
  return { valueIds: [...valueIds], figureIds: [...figureIds], sentences };
}

/** The sentences of a paragraph that rest on a stale value, as places in the text. */
function staleSentences(paragraph: Node, at: number, stale: ReadonlySet<string>): [number, number][] {
  const words = paragraph.textBetween(0, paragraph.content.size, undefined, '\ufffc');
  const ends = [...words.matchAll(/[.!?](?=\s|$)/g)].map(({ index }) => index + 1);
  const found = new Map<number, [number, number]>();
  paragraph.forEach((node, offset) => {
    if (node.type.name !== 'boundValue' || !stale.has(String(node.attrs.bindingId))) return;
    const start = ends.findLast((end) => end <= offset) ?? 0;
    const from = start + (/^\s*/.exec(words.slice(start))?.[0].length ?? 0);
    const to = ends.find((end) => end > offset) ?? words.length;
    found.set(from, [at + 1 + from, at + 1 + to]);
  });
  return [...found.values()];
}
