import { Dialog as Parts } from 'radix-ui';
import { useRef, type ReactNode } from 'react';
import { joinClasses } from './join-classes.ts';

type DialogProps = {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: ReactNode;
  /** Faint words at the right of the title: where the choice goes. */
  aside?: ReactNode;
  /** The first paragraph; read out with the title. */
  description?: ReactNode;
  /** 720 px instead of 480. */
  wide?: boolean;
  /** Confirms what can't be undone. */
  irreversible?: boolean;
  children?: ReactNode;
  acts?: ReactNode;
};

/** A sheet over the page. Focus stays inside while it is open, Esc closes it, and focus goes back to where it was. */
export function Dialog({
  open,
  onOpenChange,
  title,
  aside,
  description,
  wide,
  irreversible,
  children,
  acts,
}: DialogProps) {
  const cameFrom = useRef<Element | null>(null);
  const giveFocusBack = (event: Event) => {
    const place = cameFrom.current;
    if (!(place instanceof HTMLElement) || !place.isConnected) return;
    event.preventDefault();
    place.focus();
  };
  return (
    <Parts.Root open={open} onOpenChange={onOpenChange}>
      <Parts.Portal>
        <div className="dialog-ground" aria-hidden />
        <Parts.Content
          className={joinClasses('dialog', wide && 'is-wide')}
          aria-modal
          role={irreversible ? 'alertdialog' : 'dialog'}
          onOpenAutoFocus={() => (cameFrom.current = document.activeElement)}
          onCloseAutoFocus={giveFocusBack}
          {...(description ? {} : { 'aria-describedby': undefined })}
        >
          <div className="mb-2 flex items-baseline justify-between gap-4">
            <Parts.Title asChild>
              <h3>{title}</h3>
            </Parts.Title>
            {aside ? <span className="text-s text-ink-2">{aside}</span> : null}
          </div>
          {description ? (
            <Parts.Description asChild>
              <p>{description}</p>
            </Parts.Description>
          ) : null}
          {children}
          {acts ? <div className="acts mt-4">{acts}</div> : null}
        </Parts.Content>
      </Parts.Portal>
    </Parts.Root>
  );
}
