import { findingsOutline, type FindingsNode } from '#shared/contracts/findings.ts';
import type { Context } from '../../http/context.ts';
import { bindValue } from '../../features/findings/service/bind-value.ts';
import { placeFigure } from '../../features/findings/service/place-figure.ts';
import { writeFindings } from '../../features/findings/service/write-findings.ts';
import { listCaseMarks } from '../../features/marks/service/list-marks.ts';
import type { HeldFor } from '../../rights/open-case.ts';
import { figuresOf } from './bring-in-views.ts';
import type { DemoCase } from './demo-case.ts';
import type { Hands } from './hands.ts';
import { inForce } from './make-demo-estimates.ts';

type Writing = {
  readonly hands: Hands;
  readonly told: DemoCase;
  readonly context: Context;
  readonly heldCase: HeldFor<'write findings'>;
};

/** Writes the findings of a case: the outline, each value bound to its estimate, each figure with its marks. */
export function writeDemoFindings(hands: Hands, told: DemoCase): Promise<void> {
  const { code, holder: by } = told;
  return hands.onceIn({ name: 'findings', by, code, act: 'write findings' }, async (context, heldCase) => {
    // Values and figures are records of their own; bound before the text is written, they are not the act itself.
    const writing = { hands, told, context: hands.reading(by), heldCase };
    const nodes: FindingsNode[] = [];
    for (const title of findingsOutline) {
      nodes.push({ type: 'heading', attrs: { level: 2 }, content: [{ type: 'text', text: title }] });
      nodes.push(...(await partOf(writing, told.findings[title] ?? '')));
    }
    await writeFindings(context, heldCase, nodes);
  });
}

const place = /\{(load|mirror|flaw|fig:\d+)\}/;

/** One paragraph of a part with its values in place, then its figures. */
async function partOf(writing: Writing, text: string): Promise<FindingsNode[]> {
  const inline: FindingsNode[] = [];
  const figures: FindingsNode[] = [];
  for (const piece of text.split(place)) {
    const [, number] = /^fig:(\d+)$/.exec(piece) ?? [];
    if (number) figures.push(await figureOf(writing, Number(number)));
    else if (piece === 'load' || piece === 'mirror' || piece === 'flaw') inline.push(await valueOf(writing, piece));
    else if (piece !== '') inline.push({ type: 'text', text: piece });
  }
  return [{ type: 'paragraph', ...(inline.length > 0 ? { content: inline } : {}) }, ...figures];
}

async function valueOf({ hands, told, context, heldCase }: Writing, line: string): Promise<FindingsNode> {
  const estimate = (await inForce(hands, told)).find((each) => each.line === line);
  if (!estimate) throw new Error(`${told.code} has no estimate of the ${line} line`);
  hands.clock.passMinutes(1);
  const format = { interval: true, decimals: null, significant: null } as const;
  const quantity = 'stress at the origin' as const;
  const bound = await bindValue(context, heldCase, { sourceKind: 'estimate', sourceId: estimate.id, quantity, format });
  return { type: 'boundValue', attrs: { bindingId: bound.id } };
}

async function figureOf({ hands, told, context, heldCase }: Writing, number: number): Promise<FindingsNode> {
  const figure = (await figuresOf(hands, told)).find(({ figureNumber }) => figureNumber === number);
  if (!figure) throw new Error(`${told.code} has no Fig. ${number}`);
  hands.clock.passMinutes(1);
  const marks = (await listCaseMarks(context, heldCase)).filter(({ fractographId }) => fractographId === figure.id);
  const placed = await placeFigure(context, heldCase, {
    fractographId: figure.id,
    markIds: marks.map(({ id }) => id),
    caption: figure.caption,
    framePx: null,
    scaleBar: true,
  });
  return { type: 'figure', attrs: { figureId: placed.id } };
}
