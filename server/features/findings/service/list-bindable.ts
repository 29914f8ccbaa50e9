import type { BindableValue } from '#shared/contracts/findings.ts';
import { boundParts, boundText } from '#shared/wording/bound-value.ts';
import type { Reader } from '../../../database/connection.ts';
import { listEstimates } from '../../estimates/service/list-estimates.ts';
import { listFractographs } from '../../fractographs/service/find-fractographs.ts';
import { listConstantsInForce } from '../../materials/service/list-constants.ts';
import { readCase } from '../../marks/service/readings.ts';
import { listConstantRows, type HeldCase } from '../queries/bound-values.ts';
import { constantSaid, estimateSaid, lengthSaid, type SourceSaid } from './value-sources.ts';

const usual = { interval: true, decimals: null, significant: null } as const;
const textOf = ({ value }: SourceSaid) => boundText(boundParts(value, usual));

/** Every value of the case that can be bound now: estimates, lengths of its marks, constants of its material. */
export async function listBindable(reader: Reader, heldCase: HeldCase): Promise<BindableValue[]> {
  return [
    ...(await bindableEstimates(reader, heldCase)),
    ...(await bindableLengths(reader, heldCase)),
    ...(await bindableConstants(reader, heldCase)),
  ];
}

async function bindableEstimates(reader: Reader, heldCase: HeldCase): Promise<BindableValue[]> {
  const { estimates } = await listEstimates(reader, heldCase);
  return estimates
    .filter((estimate) => estimate.supersededById === null)
    .flatMap((estimate) =>
      (['stress at the origin', 'outer-fibre stress'] as const).flatMap((quantity): BindableValue[] => {
        const said = estimateSaid(heldCase.number, estimate, quantity);
        if (!said) return [];
        const standing = estimate.stale ? 'stale' : estimate.standing.standing === 'set aside' ? 'set aside' : null;
        return [
          {
            group: 'Estimates',
            words: said.words,
            detail: said.sourceWords,
            text: textOf(said),
            value: said.value,
            standing,
            bind: { sourceKind: 'estimate', sourceId: estimate.id, quantity, format: usual },
          },
        ];
      }),
    );
}

async function bindableLengths(reader: Reader, heldCase: HeldCase): Promise<BindableValue[]> {
  const readings = await readCase(reader, heldCase);
  const figures = new Map((await listFractographs(reader, heldCase)).map((each) => [String(each.id), each]));
  return readings.flatMap(({ mark, reading }): BindableValue[] => {
    const { valueMm, standardUncertaintyMm, quantity, way } = reading;
    const figure = figures.get(mark.fractographId);
    if (valueMm === null || standardUncertaintyMm === null || !figure) return [];
    const said = lengthSaid(heldCase.number, {
      quantity,
      valueMm,
      standardUncertaintyMm,
      markNumber: mark.number,
      fractographId: mark.fractographId,
      figureNumber: figure.figureNumber,
    });
    return [
      {
        group: 'Lengths',
        words: said.words,
        detail: `${said.sourceWords}, ${way}`,
        text: textOf(said),
        value: said.value,
        standing: null,
        bind: { sourceKind: 'measurement', markId: mark.id, measured: quantity, quantity: 'length', format: usual },
      },
    ];
  });
}

async function bindableConstants(reader: Reader, heldCase: HeldCase): Promise<BindableValue[]> {
  if (heldCase.materialId === null) return [];
  const inForce = await listConstantsInForce(reader, heldCase.materialId);
  const rows = await listConstantRows(
    reader,
    inForce.map(({ id }) => id),
  );
  return rows.map((row) => {
    const said = constantSaid(row);
    return {
      group: 'Constants',
      words: said.words,
      detail: said.sourceWords,
      text: textOf(said),
      value: said.value,
      standing: null,
      bind: { sourceKind: 'material constant', sourceId: row.id, quantity: 'constant', format: usual },
    };
  });
}
