import { useQuery, useQueryClient } from '@tanstack/react-query';
import { EditorContent, useEditor, useEditorState, type Editor } from '@tiptap/react';
import { useCallback, useEffect, useState } from 'react';
import type { Person } from '#shared/contracts/people.ts';
import type { Answer } from '#shared/rules/may.ts';
import { useFindingsText } from '#src/collaboration/findings-open.ts';
import type { FindingsText } from '#src/collaboration/findings-text.ts';
import { LoadingState } from '#src/ui/loading-state.tsx';
import { Note } from '#src/ui/note.tsx';
import { Page } from '#src/ui/page.tsx';
import { Spread } from '#src/ui/spread.tsx';
import { boundValuesOf, figuresOf } from '../api.ts';
import { findingsExtensions } from '../editor/extensions.ts';
import { outlineOf, partAt } from '../editor/outline.ts';
import { markStale, StaleMarginStore } from '../editor/stale-margin.ts';
import { BindDialog } from './bind-dialog.tsx';
import { FigureDialog } from './figure-dialog.tsx';
import { FindingsBar } from './findings-bar.tsx';
import { LeftPage } from './left-page.tsx';
import { StaleNotes } from './stale-notes.tsx';
import { toneOf } from './tone-of.ts';

type FindingsSpreadProps = { number: string; person: Person; mayWrite: Answer };

const leftFolio = { chapter: 'vi', side: 'left' } as const;
const rightFolio = { chapter: 'vi', words: 'Findings', side: 'right' } as const;
const narrowScreen = '(max-width: 640px)';

/** Chapter vi: the outline and what is bound at the left, the text that several write at the right. */
export function FindingsSpread({ number, person, mayWrite }: FindingsSpreadProps) {
  const { text, state } = useFindingsText(number, person);
  const [dialog, setDialog] = useState<'bind' | 'figure' | null>(null);
  const [margin] = useState(() => new StaleMarginStore());
  const openBind = useCallback(() => setDialog('bind'), []);
  const editor = useFindingsEditor({ number, text, margin, onBind: openBind });
  const isWritable = state.isThere && state.mayWrite && mayWrite.allowed;
  useEditable(editor, isWritable);
  useStaleMargin(number, editor, margin);
  const outline = useEditorState({ editor, selector: ({ editor: current }) => outlineOf(current.state.doc) });
  useOwnPart(editor, text);
  useRefetch(number, text);
  return (
    <Spread shape="findings">
      <Page label="Outline and state of review" folio={leftFolio} className="findings-left">
        <LeftPage
          number={number}
          outline={outline}
          people={state.people}
          isKept={state.isKept}
          mayWrite={isWritable}
          onJump={(part) => jump(editor, part.at)}
        />
      </Page>
      <Page label="Findings" folio={rightFolio}>
        <FindingsBar
          editor={editor}
          state={state}
          isWritable={isWritable}
          onBind={openBind}
          onFigure={() => setDialog('figure')}
        />
        {state.isThere && !isWritable ? (
          <p className="mb-3 text-s text-ink-2">{mayWrite.allowed ? 'Reading only for now.' : mayWrite.reason}</p>
        ) : null}
        {state.refusal ? (
          <Note tone="iron" lead="Not kept." className="mb-3" alert>
            {state.refusal} What you typed stays on this page until you leave it; copy it if it is needed.
          </Note>
        ) : null}
        {state.isThere ? null : <LoadingState words="Reading the findings…" />}
        <div className="findings-text" hidden={!state.isThere}>
          <EditorContent editor={editor} />
        </div>
        <StaleNotes number={number} editor={editor} margin={margin} mayWrite={isWritable} />
      </Page>
      {dialog === 'bind' ? <BindDialog number={number} editor={editor} onClose={() => setDialog(null)} /> : null}
      {dialog === 'figure' ? <FigureDialog number={number} editor={editor} onClose={() => setDialog(null)} /> : null}
    </Spread>
  );
}

type EditorParts = { number: string; text: FindingsText; margin: StaleMarginStore; onBind: () => void };

function useFindingsEditor({ number, text, margin, onBind }: EditorParts): Editor {
  const [options] = useState(() => ({
    extensions: findingsExtensions({
      number,
      text,
      margin,
      toneOf: (personId) => toneOf(text.state().people, personId),
      onBind,
    }),
    injectCSS: false,
    editable: false,
    immediatelyRender: true as const,
    editorProps: {
      attributes: { class: 'findings-prose', 'aria-label': 'Findings', role: 'textbox', 'aria-multiline': 'true' },
    },
  }));
  return useEditor(options, [options]);
}

function useEditable(editor: Editor, isWritable: boolean): void {
  useEffect(() => {
    if (editor.isEditable !== isWritable) editor.setEditable(isWritable);
  }, [editor, isWritable]);
}

/** Where this person writes: nowhere until the caret has once been set, and still there while a dialog is open. */
function useOwnPart(editor: Editor, text: FindingsText): void {
  const [hasBegun, setHasBegun] = useState(false);
  useEffect(() => {
    const begin = () => setHasBegun(true);
    editor.on('focus', begin);
    return () => void editor.off('focus', begin);
  }, [editor]);
  const part = useEditorState({
    editor,
    selector: ({ editor: current }) => {
      if (!current.isEditable || !hasBegun) return null;
      return partAt(outlineOf(current.state.doc).parts, current.state.selection.from);
    },
  });
  useEffect(() => text.at(part), [text, part]);
}

function useStaleMargin(number: string, editor: Editor, margin: StaleMarginStore): void {
  const { data: values } = useQuery(boundValuesOf(number));
  const { data: figures } = useQuery(figuresOf(number));
  useEffect(() => {
    const stale = new Set([...(values ?? []), ...(figures ?? [])].filter((each) => each.stale).map((each) => each.id));
    const media = window.matchMedia(narrowScreen);
    const show = () => markStale(editor.view, margin, stale, media.matches);
    show();
    media.addEventListener('change', show);
    return () => media.removeEventListener('change', show);
  }, [editor, margin, values, figures]);
}

function useRefetch(number: string, text: FindingsText): void {
  const client = useQueryClient();
  useEffect(
    () => text.hearCase(() => void client.invalidateQueries({ queryKey: ['case', number] })),
    [client, number, text],
  );
}

function jump(editor: Editor, at: number): void {
  const dom = editor.view.nodeDOM(at);
  if (dom instanceof HTMLElement) dom.scrollIntoView({ block: 'start' });
  if (editor.isEditable) editor.commands.focus(at + 1, { scrollIntoView: false });
}
