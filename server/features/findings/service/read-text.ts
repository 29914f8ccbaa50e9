import type { BoundValueView, FigureView, FindingsFacts, FindingsNode } from '#shared/contracts/findings.ts';
import { findingsField, loadFindings } from '../../../collaboration/findings-rows.ts';
import { readNodes } from '../../../collaboration/findings-nodes.ts';
import type { Reader } from '../../../database/connection.ts';
import type { HeldCase } from '../queries/bound-values.ts';
import { listFigures } from './list-figures.ts';
import { resolveValues } from './resolve-values.ts';

type Known = {
  readonly values: ReadonlyMap<string, BoundValueView>;
  readonly figures: ReadonlyMap<string, FigureView>;
};

export type ReadText = { readonly nodes: readonly FindingsNode[] } & Known;

/** The text as it is kept, with what its values and figures of this case are. */
export async function readText(reader: Reader, heldCase: HeldCase): Promise<ReadText> {
  const { text } = await loadFindings(reader, heldCase.id);
  const values = await resolveValues(reader, heldCase);
  const figures = await listFigures(reader, heldCase);
  return {
    nodes: readNodes(text.getXmlFragment(findingsField)),
    values: new Map(values.map((value) => [value.id, value])),
    figures: new Map(figures.map((figure) => [figure.id, figure])),
  };
}

/** The whole text with its values written out beside the records they are pinned to: what is hashed and printed. */
export function resolvedText(read: ReadText): FindingsNode {
  return { type: 'doc', content: read.nodes.map((node) => resolved(node, read)) };
}

function resolved(node: FindingsNode, known: Known): FindingsNode {
  if (node.type === 'boundValue') return resolvedValue(node, known);
  if (node.type === 'figure') return resolvedFigure(node, known);
  return node.content ? { ...node, content: node.content.map((child) => resolved(child, known)) } : node;
}

const idOf = (node: FindingsNode, name: string) => String(node.attrs?.[name] ?? '');

/** A binding of another case, or of none, is said to be not in this case and never shows a value. */
function resolvedValue(node: FindingsNode, { values }: Known): FindingsNode {
  const bindingId = idOf(node, 'bindingId');
  const value = values.get(bindingId);
  if (!value) return { type: 'boundValue', attrs: { bindingId, text: 'not in this case', unresolved: true } };
  const { sourceKind, sourceId, quantity, text, parts } = value;
  return {
    type: 'boundValue',
    attrs: { bindingId, sourceKind, sourceId, quantity, text, ...parts, stale: value.stale !== null },
  };
}

function resolvedFigure(node: FindingsNode, { figures }: Known): FindingsNode {
  const figureId = idOf(node, 'figureId');
  const figure = figures.get(figureId);
  if (!figure) return { type: 'figure', attrs: { figureId, text: 'not in this case', unresolved: true } };
  const { fractographId, figureNumber, caption, marks } = figure;
  const markVersionIds = marks.map((mark) => mark.versionId);
  return {
    type: 'figure',
    attrs: { figureId, fractographId, figureNumber, caption, markVersionIds, stale: figure.stale !== null },
  };
}

/** What the readiness list asks of the text as it is kept. */
export async function findFindingsFacts(reader: Reader, heldCase: HeldCase): Promise<FindingsFacts> {
  const read = await readText(reader, heldCase);
  const parts = partsOf(read.nodes);
  const text = read.nodes.map(wordsOf).join('\n');
  const placed = parts.flatMap(({ title, nodes }) =>
    nodes.flatMap(inlineNodes).map((node) => ({ node, part: title, found: lookUp(node, read) })),
  );
  return {
    text,
    wordCount: (text.match(/[\p{L}\p{N}][\p{L}\p{N}'’.,-]*/gu) ?? []).length,
    staleBoundValues: placed.flatMap(({ part, found }) =>
      found?.stale ? [{ id: found.id, words: found.words, part, why: found.stale.why }] : [],
    ),
    figures: placed.filter(({ node, found }) => node.type === 'figure' && found).length,
    unresolved: placed.filter(({ found }) => !found).length,
    emptyParts: parts.filter(({ title, nodes }) => title !== '' && nodes.every(isEmpty)).map(({ title }) => title),
  };
}

function lookUp(node: FindingsNode, { values, figures }: Known) {
  if (node.type === 'boundValue') return values.get(idOf(node, 'bindingId'));
  const figure = figures.get(idOf(node, 'figureId'));
  return figure && { ...figure, words: `Fig. ${figure.figureNumber}` };
}

/** The text by its parts: what stands under each heading of the second level; what stands before the first is untitled. */
function partsOf(nodes: readonly FindingsNode[]): { title: string; nodes: FindingsNode[] }[] {
  const parts: { title: string; nodes: FindingsNode[] }[] = [{ title: '', nodes: [] }];
  for (const node of nodes) {
    if (node.type === 'heading' && node.attrs?.level === 2) parts.push({ title: wordsOf(node), nodes: [] });
    else parts.at(-1)?.nodes.push(node);
  }
  return parts;
}

function inlineNodes(node: FindingsNode): FindingsNode[] {
  if (node.type === 'boundValue' || node.type === 'figure') return [node];
  return (node.content ?? []).flatMap(inlineNodes);
}

function isEmpty(node: FindingsNode): boolean {
  return wordsOf(node).trim() === '' && inlineNodes(node).length === 0;
}

function wordsOf(node: FindingsNode): string {
  if (node.type === 'text') return node.text ?? '';
  const between = node.type === 'paragraph' || node.type === 'heading' ? '' : '\n';
  return (node.content ?? []).map(wordsOf).join(between);
}
