import { useQuery } from '@tanstack/react-query';
import type { Editor } from '@tiptap/react';
import { useState } from 'react';
import type { FractographView } from '#shared/contracts/fractographs.ts';
import type { MarkView } from '#shared/contracts/marks.ts';
import { markKindTable } from '#shared/vocabulary/mark-kinds.ts';
import { Button } from '#src/ui/button.tsx';
import { CheckField } from '#src/ui/check-field.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FieldError } from '#src/ui/field-error.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextArea } from '#src/ui/text-area.tsx';
import { imagesOf, marksOfCase, useFindingsActs } from '../api.ts';

type FigureDialogProps = { number: string; editor: Editor; onClose: () => void };

/** Chooses a fractograph and the marks that are drawn in, and says what is seen. */
export function FigureDialog({ number, editor, onClose }: FigureDialogProps) {
  const { data: images = [] } = useQuery(imagesOf(number));
  const { data: marks = [] } = useQuery(marksOfCase(number));
  const { place } = useFindingsActs(number);
  const [imageId, setImageId] = useState('');
  const [left, setLeft] = useState<ReadonlySet<string>>(new Set());
  const [caption, setCaption] = useState<string | null>(null);
  const ready = images.filter((each) => each.state === 'ready');
  const image = ready.find((each) => each.id === imageId) ?? ready[0];
  const onImage = marks.filter((mark) => mark.fractographId === image?.id && !mark.removed);
  const drawn = onImage.filter((mark) => !left.has(mark.id));
  const said = caption ?? image?.caption ?? '';
  const placeIt = () => {
    if (!image) return;
    place.mutate(
      { fractographId: image.id, markIds: drawn.map((mark) => mark.id), caption: said, framePx: null, scaleBar: true },
      {
        onSuccess: (made) => {
          if (made) editor.chain().focus().insertFigure(made.id).run();
          onClose();
        },
      },
    );
  };
  return (
    <Dialog
      open
      wide
      onOpenChange={(open) => (open ? undefined : onClose())}
      title="Figure"
      description="The figure shows the chosen marks as they stand now, with the scale bar; when a mark is moved it says that it is stale."
      acts={
        <>
          <Button kind="main" disabled={place.isPending} closedBecause={closedBecause(image, said)} onClick={placeIt}>
            {image ? `Place Fig. ${image.figureNumber}` : 'Place the figure'}
          </Button>
          <Button onClick={onClose}>Leave without</Button>
        </>
      }
    >
      <div className="grid gap-3">
        <SelectField
          label="Fractograph"
          value={image?.id ?? ''}
          onChange={(event) => {
            setImageId(event.target.value);
            setCaption(null);
          }}
        >
          {ready.map((each) => (
            <option key={each.id} value={each.id}>
              {nameOf(each)}
            </option>
          ))}
        </SelectField>
        <fieldset>
          <legend className="field-label">Marks drawn in</legend>
          {onImage.length === 0 ? <p className="text-s text-ink-2">No mark stands on it.</p> : null}
          <div className="flex flex-wrap gap-x-5">
            {onImage.map((mark) => (
              <CheckField
                key={mark.id}
                label={markWords(mark)}
                checked={!left.has(mark.id)}
                onChange={() => setLeft(toggled(left, mark.id))}
              />
            ))}
          </div>
        </fieldset>
        <TextArea
          label="What is seen"
          help="Stands under the figure, and in its place where it cannot be seen."
          value={said}
          onChange={(event) => setCaption(event.target.value)}
        />
        {place.error ? <FieldError id="figure-fault">{place.error.message}</FieldError> : null}
      </div>
    </Dialog>
  );
}

function closedBecause(image: FractographView | undefined, caption: string): string | undefined {
  if (!image) return 'No fractograph of this case is ready yet.';
  return caption.trim() === '' ? 'Say what is seen.' : undefined;
}

function nameOf({ figureNumber, caption, fileName, scale }: FractographView): string {
  return `Fig. ${figureNumber}, ${caption === '' ? fileName : caption}${scale ? '' : ', uncalibrated'}`;
}

const markWords = ({ number, kind }: MarkView) => `m${number} ${markKindTable[kind].word.toLowerCase()}`;

function toggled(set: ReadonlySet<string>, id: string): ReadonlySet<string> {
  const next = new Set(set);
  if (!next.delete(id)) next.add(id);
  return next;
}
