import { PlusIcon } from '@phosphor-icons/react/dist/csr/Plus';
import { useId, useState, type DragEvent, type ReactNode } from 'react';
import { buttonClasses } from '#src/ui/button-classes.ts';
import { joinClasses } from '#src/ui/join-classes.ts';

type DropPlaceProps = { onFiles: (files: readonly File[]) => void; children: ReactNode };

/** A part of the page that takes files dropped on it. */
export function DropPlace({ onFiles, children }: DropPlaceProps) {
  const [isOver, setIsOver] = useState(false);
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(false);
    const files = [...event.dataTransfer.files];
    if (files.length > 0) onFiles(files);
  };
  return (
    <div
      className={joinClasses('min-h-full', isOver && 'outline-2 outline-offset-4 outline-cobalt outline-dashed')}
      onDragOver={(event) => {
        event.preventDefault();
        setIsOver(true);
      }}
      onDragLeave={(event) => {
        if (!event.currentTarget.contains(event.relatedTarget instanceof Node ? event.relatedTarget : null))
          setIsOver(false);
      }}
      onDrop={drop}
    >
      {children}
    </div>
  );
}

type ChooseImagesProps = { onFiles: (files: readonly File[]) => void; main?: boolean };

/** The button that opens the choice of files; several may be chosen. */
export function ChooseImages({ onFiles, main = false }: ChooseImagesProps) {
  const id = useId();
  return (
    <span className="inline-flex">
      <input
        id={id}
        type="file"
        multiple
        accept=".tif,.tiff,.png,.jpg,.jpeg,.webp,image/tiff,image/png,image/jpeg,image/webp"
        className="peer sr-only"
        onChange={(event) => {
          const files = [...(event.currentTarget.files ?? [])];
          event.currentTarget.value = '';
          if (files.length > 0) onFiles(files);
        }}
      />
      <label
        htmlFor={id}
        className={buttonClasses(
          { kind: main ? 'main' : 'outlined' },
          'cursor-pointer peer-focus-visible:outline-2 peer-focus-visible:outline-offset-2 peer-focus-visible:outline-cobalt',
        )}
      >
        <PlusIcon size={15} aria-hidden />
        Choose images
      </label>
    </span>
  );
}
