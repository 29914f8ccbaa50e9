import { Link } from 'react-router-dom';
import type { MaterialView } from '#shared/contracts/materials.ts';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';

/** Every material with its family and how many of its constants are in force. */
export function MaterialsTable({ materials }: { materials: readonly MaterialView[] }) {
  return (
    <Table caption="Materials" stacked>
      <thead>
        <tr>
          <Th>Material</Th>
          <Th>Family</Th>
          <Th>Route</Th>
          <Th numeric>Grain</Th>
          <Th numeric>Constants in force</Th>
        </tr>
      </thead>
      <tbody>
        {materials.map(({ id, name, family, route, grainSizeUm, constantsInForce }) => (
          <tr key={id}>
            <td className="font-semibold">
              <Link to={`/materials/${id}`}>{name}</Link>
            </td>
            <td className="text-ink-2">{family}</td>
            <td className="is-wide text-ink-2">{route ?? ''}</td>
            <td className="num text-ink-2" data-word="grain">
              {grainSizeUm === null ? 'not said' : `${grainSizeUm}\u00a0µm`}
            </td>
            <td className="num" data-word="constants">
              {constantsInForce === 0 ? <span className="text-ink-3">none yet</span> : constantsInForce}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
