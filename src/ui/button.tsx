import { useId, type ComponentProps, type ReactNode } from 'react';
import { buttonClasses, type ButtonLook } from './button-classes.ts';

type ButtonProps = ComponentProps<'button'> &
  ButtonLook & {
    icon?: ReactNode;
    /** What opens the button or who may press it. Given, the button is closed and the words stand beside it. */
    closedBecause?: ReactNode;
  };

/** A button whose label is a verb and its object. It is never closed without saying why. */
export function Button({ kind, small, icon, closedBecause, className, children, disabled, ...rest }: ButtonProps) {
  const reasonId = useId();
  const isClosed = Boolean(closedBecause);
  const button = (
    <button
      type="button"
      {...rest}
      disabled={disabled === true || isClosed}
      aria-describedby={isClosed ? reasonId : rest['aria-describedby']}
      className={buttonClasses({ kind, small }, className)}
    >
      {icon}
      {children}
    </button>
  );
  if (!isClosed) return button;
  return (
    <span className="inline-flex flex-col items-start gap-1">
      {button}
      <span id={reasonId} className="text-s text-ink-2">
        {closedBecause}
      </span>
    </span>
  );
}
