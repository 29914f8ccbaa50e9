import type { FigureView } from '#shared/contracts/findings.ts';
import { FractographId } from '#shared/contracts/ids.ts';
import { figureSvg } from '#shared/rules/marks-to-svg.ts';
import type { Reader } from '../../../database/connection.ts';
import type { Context } from '../../../http/context.ts';
import { listOpenStaleness } from '../../../lineage/settle-staleness.ts';
import { nothingHere } from '../../../rights/open-case.ts';
import { findCrop } from '../../fractographs/service/read-pictures.ts';
import type { HeldCase } from '../queries/bound-values.ts';
import { listFigureMarks, listFigureRows, listFigureScales, type FigureRow } from '../queries/figures.ts';
import { drawnSize, frameAround, sharpness } from './figure-frame.ts';

/** The figures of the text, as they were drawn; stale where a mark or a scale has changed since. */
export async function listFigures(reader: Reader, heldCase: HeldCase): Promise<FigureView[]> {
  const rows = await listFigureRows(reader, heldCase);
  const marks = await listFigureMarks(reader, heldCase);
  const scales = await listFigureScales(reader, heldCase);
  const stale = await listOpenStaleness(
    reader,
    rows.map((row) => row.id),
  );
  return rows.map((row) => {
    const drawn = marks.filter((mark) => mark.figureId === row.id);
    const open = stale.find((each) => each.recordId === row.id);
    const newer = rows.find((each) => each.id === row.supersededById);
    const why = newer ? 'it has been drawn again' : open?.why;
    const since = newer?.madeAt ?? open?.since;
    return {
      id: row.id,
      fractographId: FractographId.parse(row.fractographId),
      figureNumber: row.figureNumber,
      caption: row.caption,
      marks: drawn.map(({ id, number, versionId }) => ({ id, number, versionId })),
      scaleBar: row.scaleBar,
      calibrated: scales.some((scale) => scale.figureId === row.id),
      ...drawnSize(frameOf(row, drawn)),
      href: `/cases/${heldCase.number}/fractographs/${row.fractographId}`,
      stale: why && since ? { why, since: since.toISOString() } : null,
    };
  });
}

/** The figure drawn: the part of the image with the marks as they stood, and the bar. @throws Problem not-found */
export async function drawFigure(context: Context, heldCase: HeldCase, id: string) {
  const row = (await listFigureRows(context.reader, heldCase)).find((each) => each.id === id);
  if (!row) throw nothingHere();
  const marks = (await listFigureMarks(context.reader, heldCase)).filter((mark) => mark.figureId === id);
  const scale = (await listFigureScales(context.reader, heldCase)).find((each) => each.figureId === id) ?? null;
  const framePx = frameOf(row, marks);
  const size = drawnSize(framePx);
  const crop = await findCrop(
    { context, heldCase, id: FractographId.parse(row.fractographId) },
    {
      x: framePx.x + framePx.width / 2,
      y: framePx.y + framePx.height / 2,
      across: framePx.width,
      width: size.widthPx * sharpness,
      height: size.heightPx * sharpness,
    },
  );
  const read = async () => {
    const picture = `data:${crop.type};base64,${Buffer.from(await crop.read()).toString('base64')}`;
    const words = `Fig. ${row.figureNumber}: ${row.caption}`;
    const bar = row.scaleBar ? { scale } : {};
    return Buffer.from(figureSvg({ marks, framePx, ...size, picture, words, ...bar }));
  };
  // A figure is a record: what is drawn under its id never changes.
  return { tag: `figure-${id}`, type: 'image/svg+xml', read };
}

function frameOf(row: FigureRow, marks: Parameters<typeof frameAround>[1]) {
  return row.framePx ?? frameAround({ widthPx: row.imageWidthPx ?? 1, heightPx: row.imageHeightPx ?? 1 }, marks);
}
