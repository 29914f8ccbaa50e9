import type { Node } from '@tiptap/pm/model';

export type Part = {
  /** 1 for the first part; the outline, the carets and the margin name parts by it. */
  readonly number: number;
  readonly title: string;
  /** Where its heading stands in the text. */
  readonly at: number;
  readonly isEmpty: boolean;
};

export type Placed = { readonly kind: 'value' | 'figure'; readonly id: string; readonly part: number };

/** The parts of a text, and in which of them each value and figure stands. Part 0 is what stands before the first. */
export function outlineOf(doc: Node): { parts: Part[]; placed: Placed[] } {
  const parts: Part[] = [];
  const placed: Placed[] = [];
  doc.forEach((block, at) => {
    if (block.type.name === 'heading' && block.attrs.level === 2) {
      parts.push({ number: parts.length + 1, title: block.textContent, at, isEmpty: true });
      return;
    }
    const last = parts.at(-1);
    let holdsSomething = block.textContent.trim() !== '';
    const look = (node: Node) => {
      const kind = node.type.name === 'boundValue' ? 'value' : node.type.name === 'figure' ? 'figure' : null;
      if (!kind) return;
      holdsSomething = true;
      placed.push({
        kind,
        id: String(node.attrs[kind === 'value' ? 'bindingId' : 'figureId']),
        part: last?.number ?? 0,
      });
    };
    look(block);
    block.descendants((node) => look(node));
    if (last && holdsSomething) parts[parts.length - 1] = { ...last, isEmpty: false };
  });
  return { parts, placed };
}

/** The number of the part that a place in the text lies in; 0 before the first. */
export function partAt(parts: readonly Part[], at: number): number {
  return parts.findLast((part) => part.at <= at)?.number ?? 0;
}
