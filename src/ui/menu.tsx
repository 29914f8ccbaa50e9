import { DropdownMenu } from 'radix-ui';
import type { ReactElement, ReactNode } from 'react';

type MenuProps = {
  /** The button that opens it. */
  opener: ReactElement;
  /** `MenuEntry`, `MenuRule`. */
  children: ReactNode;
  align?: 'start' | 'end';
};

/** A list of acts or places under a button. Arrows move, letters jump, Esc closes. */
export function Menu({ opener, children, align = 'start' }: MenuProps) {
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger asChild>{opener}</DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content className="menu" align={align} sideOffset={6} collisionPadding={8}>
          {children}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}
