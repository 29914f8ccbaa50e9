import { FractographId } from '#shared/contracts/ids.ts';
import type { MeasurementView } from '#shared/contracts/marks.ts';
import type { Context } from '../../../http/context.ts';
import { listFigureNumbers, type HeldCase } from '../queries.ts';
import { readCase } from './readings.ts';

/** The lengths of a case that can be taken as inputs; those of an image without a scale say px only. */
export async function listMeasurements(context: Context, heldCase: HeldCase): Promise<MeasurementView[]> {
  const readings = await readCase(context.reader, heldCase);
  const figures = await listFigureNumbers(context.reader, heldCase);
  const figureOf = (id: string) => figures.find((row) => row.id === id)?.figureNumber ?? notAFigure(id);
  return readings.map(({ mark, reading }) => ({
    markId: mark.id,
    markNumber: mark.number,
    kind: mark.kind,
    certainty: mark.certainty,
    boundary: mark.boundary,
    flawShape: mark.geometry.shape === 'ellipse' ? mark.geometry.flawShape : null,
    flawPlace: mark.geometry.shape === 'ellipse' ? mark.geometry.place : null,
    fractographId: FractographId.parse(mark.fractographId),
    figureNumber: figureOf(mark.fractographId),
    quantity: reading.quantity,
    way: reading.way,
    valuePx: reading.valuePx,
    valueMm: reading.valueMm,
    standardUncertaintyMm: reading.standardUncertaintyMm,
  }));
}

function notAFigure(id: string): never {
  throw new Error(`a mark stands on fractograph ${id}, which is not in its case`);
}
