import { ImageIcon } from '@phosphor-icons/react/dist/csr/Image';
import { LinkSimpleIcon } from '@phosphor-icons/react/dist/csr/LinkSimple';
import { ListBulletsIcon } from '@phosphor-icons/react/dist/csr/ListBullets';
import { ListNumbersIcon } from '@phosphor-icons/react/dist/csr/ListNumbers';
import { TableIcon } from '@phosphor-icons/react/dist/csr/Table';
import { TextHThreeIcon } from '@phosphor-icons/react/dist/csr/TextHThree';
import { useEditorState, type Editor } from '@tiptap/react';
import type { ReactNode } from 'react';
import type { FindingsState, PersonWriting } from '#src/collaboration/findings-text.ts';
import { joinClasses } from '#src/ui/join-classes.ts';
import { Kept } from '#src/ui/kept.tsx';
import { toneOf } from './tone-of.ts';

type FindingsBarProps = {
  editor: Editor;
  state: FindingsState;
  isWritable: boolean;
  onBind: () => void;
  onFigure: () => void;
};

/** Over the text: who is here and where, what can be set, and whether what stands here is kept. */
export function FindingsBar({ editor, state, isWritable, onBind, onFigure }: FindingsBarProps) {
  return (
    <div className="findings-bar">
      <People people={state.people} />
      {isWritable ? <Tools editor={editor} onBind={onBind} onFigure={onFigure} /> : null}
      <Kept>{keptWords(state)}</Kept>
    </div>
  );
}

function People({ people }: { people: readonly PersonWriting[] }) {
  const once = [...new Map(people.map((each) => [each.personId, each])).values()];
  const sorted = once.sort((one, other) => Number(other.isSelf) - Number(one.isSelf));
  return (
    <ul className="findings-people" aria-label="Who is here">
      {sorted.map((each) => (
        <li
          key={each.personId}
          className={
            each.isSelf ? 'is-self' : each.mayWrite ? `is-other-${toneOf(people, each.personId)}` : 'is-reading'
          }
        >
          {each.name.split(' ')[0]}, {doing(each)}
        </li>
      ))}
    </ul>
  );
}

function doing({ mayWrite, part }: PersonWriting): string {
  if (!mayWrite || part === null) return 'reading';
  return part === 0 ? 'writing' : `writing in ${part}`;
}

function keptWords({ isThere, isConnected, isKept, keptAt }: FindingsState): string {
  if (!isThere) return '';
  if (!isKept) return isConnected ? 'Not kept yet' : 'Not kept yet: no connection';
  if (!isConnected) return 'No connection; all is kept';
  return keptAt ? `Kept ${timeOf(keptAt)}` : 'Nothing written yet';
}

function timeOf(instant: string): string {
  return new Date(instant).toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });
}

function Tools({ editor, onBind, onFigure }: Pick<FindingsBarProps, 'editor' | 'onBind' | 'onFigure'>) {
  const on = useEditorState({
    editor,
    selector: ({ editor: current }) => ({
      bold: current.isActive('bold'),
      italic: current.isActive('italic'),
      heading: current.isActive('heading', { level: 3 }),
      bullets: current.isActive('bulletList'),
      numbers: current.isActive('orderedList'),
    }),
  });
  const then = () => editor.chain().focus();
  return (
    <div className="findings-tools" role="toolbar" aria-label="Setting the text">
      <Tool words="Bold" on={on.bold} onPress={() => then().toggleBold().run()}>
        <b>Bold</b>
      </Tool>
      <Tool words="Italic" on={on.italic} onPress={() => then().toggleItalic().run()}>
        <i>Italic</i>
      </Tool>
      <Tool words="Small heading" on={on.heading} onPress={() => then().toggleHeading({ level: 3 }).run()}>
        <TextHThreeIcon size={16} aria-hidden />
      </Tool>
      <Tool words="List" on={on.bullets} onPress={() => then().toggleBulletList().run()}>
        <ListBulletsIcon size={16} aria-hidden />
      </Tool>
      <Tool words="Numbered list" on={on.numbers} onPress={() => then().toggleOrderedList().run()}>
        <ListNumbersIcon size={16} aria-hidden />
      </Tool>
      <Tool words="Table" onPress={() => then().insertTable({ rows: 3, cols: 3, withHeaderRow: true }).run()}>
        <TableIcon size={16} aria-hidden />
      </Tool>
      <Tool words="Bind a value" onPress={onBind}>
        <LinkSimpleIcon size={15} aria-hidden />
        <span className="tool-words">Bind a value</span>
      </Tool>
      <Tool words="Figure" onPress={onFigure}>
        <ImageIcon size={15} aria-hidden />
        <span className="tool-words">Figure</span>
      </Tool>
    </div>
  );
}

type ToolProps = { words: string; on?: boolean; onPress: () => void; children: ReactNode };

function Tool({ words, on, onPress, children }: ToolProps) {
  return (
    <button
      type="button"
      className={joinClasses('findings-tool', on && 'is-on')}
      aria-label={words}
      title={words}
      aria-pressed={on}
      // The caret stays where it is in the text.
      onMouseDown={(event) => event.preventDefault()}
      onClick={onPress}
    >
      {children}
    </button>
  );
}
