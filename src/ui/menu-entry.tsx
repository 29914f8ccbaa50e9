import { DropdownMenu } from 'radix-ui';
import type { ReactElement } from 'react';
import type { ReactNode } from 'react';
import { joinClasses } from './join-classes.ts';

type MenuEntryProps = { onChosen: () => void; iron?: boolean; disabled?: boolean; children: ReactNode };

/** An act in a menu. */
export function MenuEntry({ onChosen, iron, disabled, children }: MenuEntryProps) {
  return (
    <DropdownMenu.Item className={joinClasses('menu-entry', iron && 'is-iron')} disabled={disabled} onSelect={onChosen}>
      {children}
    </DropdownMenu.Item>
  );
}

/** A place in a menu: its child is a real link. */
export function MenuPlace({ children }: { children: ReactElement }) {
  return (
    <DropdownMenu.Item asChild className="menu-entry">
      {children}
    </DropdownMenu.Item>
  );
}

/** A hairline between groups of a menu. */
export function MenuRule() {
  return <DropdownMenu.Separator className="menu-rule" />;
}
