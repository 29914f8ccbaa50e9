import type { SealedPartView } from '#shared/contracts/closure.ts';
import { Table } from '#src/ui/table.tsx';
import { Th } from '#src/ui/th.tsx';

/** Digits of a fingerprint that are shown; the whole of it is in the title. */
const shownDigits = 16;

/** The parts of the case with what they hold and their fingerprints. */
export function SealedParts({ parts, caption }: { parts: readonly SealedPartView[]; caption: string }) {
  return (
    <Table caption={caption} className="is-sealed">
      <thead>
        <tr>
          <Th hidden>Chapter</Th>
          <Th>Part of the case</Th>
          <Th>Holding</Th>
          <Th>Fingerprint</Th>
        </tr>
      </thead>
      <tbody>
        {parts.map(({ key, chapter, name, holding, hash }) => (
          <tr key={key}>
            <td className="w-[34px] font-serif text-ink-3 italic">{chapter}</td>
            <td className={chapter === '' ? undefined : 'font-semibold'}>{name}</td>
            <td className="text-ink-2">{holding}</td>
            <td className="whitespace-nowrap text-ink-3">
              {hash ? <Fingerprint hash={hash} /> : 'made at the closing'}
            </td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function Fingerprint({ hash }: { hash: string }) {
  const half = shownDigits / 2;
  return (
    <span className="mono text-xs" title={hash}>
      {hash.slice(0, half)} {hash.slice(half, shownDigits)}
    </span>
  );
}
