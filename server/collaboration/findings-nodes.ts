import * as Y from 'yjs';
import type { FindingsNode } from '#shared/contracts/findings.ts';

// Between the editor's nodes (ProseMirror JSON) and the shared text (Yjs), in the form that @tiptap/y-tiptap gives it:
// a node is an element with its attributes, a run of text carries its marks as formatting. No schema is needed, and
// only the kinds of node listed here ever leave a shared text: whatever a forged client put in besides is left out.

const attributesOf: Readonly<Record<string, readonly string[]>> = {
  paragraph: [],
  heading: ['level'],
  bulletList: [],
  orderedList: ['start'],
  listItem: [],
  blockquote: [],
  hardBreak: [],
  horizontalRule: [],
  table: [],
  tableRow: [],
  tableHeader: ['colspan', 'rowspan'],
  tableCell: ['colspan', 'rowspan'],
  boundValue: ['bindingId'],
  figure: ['figureId'],
};
const markTypes = ['bold', 'italic', 'underline', 'strike', 'code'];

/** Puts nodes at the end of a shared text. @throws Error for a kind of node that findings do not have */
export function writeNodes(fragment: Y.XmlFragment, nodes: readonly FindingsNode[]): void {
  fragment.push(elementsOf(nodes));
}

function elementsOf(nodes: readonly FindingsNode[]): (Y.XmlElement | Y.XmlText)[] {
  const elements: (Y.XmlElement | Y.XmlText)[] = [];
  let run: FindingsNode[] = [];
  const endRun = () => {
    if (run.length > 0) elements.push(textOf(run));
    run = [];
  };
  for (const node of nodes) {
    if (node.type === 'text') run.push(node);
    else {
      endRun();
      elements.push(elementOf(node));
    }
  }
  endRun();
  return elements;
}

function textOf(run: readonly FindingsNode[]): Y.XmlText {
  const text = new Y.XmlText();
  text.applyDelta(
    run.map(({ text: insert = '', marks = [] }) => ({
      insert,
      attributes: Object.fromEntries(marks.map((mark) => [mark.type, {}])),
    })),
  );
  return text;
}

function elementOf(node: FindingsNode): Y.XmlElement {
  const known = attributesOf[node.type];
  if (!known) throw new Error(`findings have no ${node.type}`);
  const element = new Y.XmlElement(node.type);
  for (const name of known) {
    const value = node.attrs?.[name];
    if (value !== undefined && value !== null) element.setAttribute(name, value as string); // brand: an attribute may be any JSON, whatever its type says
  }
  element.insert(0, elementsOf(node.content ?? []));
  return element;
}

/** The nodes of a shared text, only such as findings have. */
export function readNodes(fragment: Y.XmlFragment | Y.XmlElement): FindingsNode[] {
  return fragment.toArray().flatMap((child) => {
    if (child instanceof Y.XmlText) return textNodes(child);
    return child instanceof Y.XmlElement ? nodeOf(child) : [];
  });
}

function nodeOf(element: Y.XmlElement): FindingsNode[] {
  const known = attributesOf[element.nodeName];
  if (!known) return [];
  const held: Record<string, unknown> = element.getAttributes();
  const attrs = Object.fromEntries(known.flatMap((name) => attribute(name, held[name])));
  const content = readNodes(element);
  return [
    {
      type: element.nodeName,
      ...(Object.keys(attrs).length > 0 ? { attrs } : {}),
      ...(content.length > 0 ? { content } : {}),
    },
  ];
}

function attribute(name: string, value: unknown): [string, string | number][] {
  return typeof value === 'string' || typeof value === 'number' ? [[name, value]] : [];
}

function textNodes(text: Y.XmlText): FindingsNode[] {
  const delta: { insert?: unknown; attributes?: Record<string, unknown> }[] = text.toDelta();
  return delta.flatMap(({ insert, attributes = {} }) => {
    if (typeof insert !== 'string' || insert === '') return [];
    const marks = markTypes.filter((type) => attributes[type]).map((type) => ({ type }));
    return [{ type: 'text', text: insert, ...(marks.length > 0 ? { marks } : {}) }];
  });
}
