import { drawMark } from '../../features/marks/service/draw-mark.ts';
import { findFigure } from './bring-in-views.ts';
import type { DemoCase, DemoReading } from './demo-case.ts';
import type { Hands } from './hands.ts';
import { marksOf } from './mark-views.ts';
import type { CaseView } from './views.ts';

/** A reader marks the figure they read. */
export async function drawReading(
  hands: Hands,
  told: DemoCase,
  views: readonly CaseView[],
  reading: DemoReading,
): Promise<void> {
  const view = views.find(({ figure }) => figure === reading.figure);
  if (!view) throw new Error(`${told.code} has no Fig. ${reading.figure}`);
  const { id } = await findFigure(hands, told, reading.figure);
  const { certainty, by } = reading;
  for (const [index, mark] of marksOf(view.spec, reading).entries()) {
    const drawing = { name: `mark ${reading.figure}.${index + 1}`, by, code: told.code, act: 'mark' } as const;
    await hands.onceIn(drawing, (context, heldCase) => drawMark(context, heldCase, id, { ...mark, certainty }));
  }
}
