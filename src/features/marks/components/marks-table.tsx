import { EyeIcon } from '@phosphor-icons/react/dist/csr/Eye';
import { EyeSlashIcon } from '@phosphor-icons/react/dist/csr/EyeSlash';
import { Fragment } from 'react';
import { markKindTable } from '#shared/vocabulary/mark-kinds.ts';
import { GlyphWord } from '../../../ui/glyph-word.tsx';
import { MarkGlyph } from '../../../ui/glyphs/mark-glyph.tsx';
import { Table } from '../../../ui/table.tsx';
import { Th } from '../../../ui/th.tsx';
import type { MarkChange } from '../mark-change.ts';
import { markName, readingWords, seenWords, type ListedMark, type ReadFrom } from '../listed-mark.ts';
import { MarkDetails } from './mark-details.tsx';

export type MarkActs = {
  onSelect: (markId: string | null) => void;
  onChange: (markId: string, change: MarkChange) => void;
  onRemove: (markId: string) => void;
  onShow: (markId: string, shown: boolean) => void;
  onVersions: (markId: string) => void;
};

type MarksTableProps = MarkActs & {
  marks: readonly ListedMark[];
  from: ReadFrom;
  selectedId: string | null;
  hiddenIds: readonly string[];
  /** Why marks cannot be changed here; null where they can. */
  closedBecause: string | null;
};

/** The marks of one face as a list: each can be selected, changed by numbers, taken off and hidden from here. */
export function MarksTable({ marks, selectedId, ...rest }: MarksTableProps) {
  const shown = marks.filter((mark) => !mark.removed);
  return (
    <Table caption="Marks on this face" rows="bench">
      <thead>
        <tr>
          <Th className="!pl-[9px]">No.</Th>
          <Th>Mark</Th>
          <Th>As seen</Th>
          <Th>Reading</Th>
          <Th>By</Th>
          <Th hidden>Shown on the image</Th>
        </tr>
      </thead>
      <tbody>
        {shown.map((mark) => (
          <Fragment key={mark.id}>
            <MarkRow mark={mark} isSelected={mark.id === selectedId} {...rest} />
            {mark.id === selectedId ? (
              <tr>
                <td colSpan={6} className="!h-auto">
                  <MarkDetails
                    mark={mark}
                    closedBecause={rest.closedBecause}
                    onChange={(change) => rest.onChange(mark.id, change)}
                    onRemove={() => rest.onRemove(mark.id)}
                    onVersions={() => rest.onVersions(mark.id)}
                  />
                </td>
              </tr>
            ) : null}
          </Fragment>
        ))}
      </tbody>
    </Table>
  );
}

type MarkRowProps = Omit<MarksTableProps, 'marks' | 'selectedId'> & { mark: ListedMark; isSelected: boolean };

function MarkRow({ mark, isSelected, from, hiddenIds, onSelect, onShow }: MarkRowProps) {
  const name = markName(mark);
  return (
    <tr aria-selected={isSelected}>
      <td className="mono !pl-[9px] text-[13px]">
        <button
          type="button"
          className="min-h-6 coarse:min-h-[44px]"
          aria-expanded={isSelected}
          aria-label={`${name}, ${markKindTable[mark.kind].word}`}
          onClick={() => onSelect(isSelected ? null : mark.id)}
        >
          {name}
        </button>
      </td>
      <td>
        <GlyphWord glyph={<MarkGlyph shape={mark.kind} />}>{markKindTable[mark.kind].word}</GlyphWord>
      </td>
      <td className="max-w-[220px] truncate text-ink-2">{seenWords(mark)}</td>
      <td className="whitespace-nowrap">{readingWords(mark, from)}</td>
      <td className="whitespace-nowrap text-ink-2">{mark.waiting ? 'not kept yet' : mark.madeBy.name}</td>
      <td>
        <ShownButton name={name} shown={!hiddenIds.includes(mark.id)} onShow={(shown) => onShow(mark.id, shown)} />
      </td>
    </tr>
  );
}

function ShownButton({ name, shown, onShow }: { name: string; shown: boolean; onShow: (shown: boolean) => void }) {
  const words = shown ? `Hide ${name}` : `Show ${name}`;
  const Icon = shown ? EyeIcon : EyeSlashIcon;
  return (
    <button
      type="button"
      className="flex size-6 items-center justify-center coarse:size-[44px]"
      aria-label={words}
      title={words}
      onClick={() => onShow(!shown)}
    >
      <Icon size={15} aria-hidden />
    </button>
  );
}
