import type { ReactNode } from 'react';

type SavedTabsProps = {
  /** Names the list for a screen reader: "Saved filters". */
  label: string;
  /** Links or buttons, each ending in a `TabCount`; the current one has `aria-current`. */
  children: ReactNode;
  /** At the right of the rule: "Keep this filter". */
  aside?: ReactNode;
};

/** Text tabs over a rule. */
export function SavedTabs({ label, children, aside }: SavedTabsProps) {
  return (
    <div className="flex items-baseline justify-between gap-6 border-b border-rule">
      <nav aria-label={label} className="saved-tabs -mb-px">
        {children}
      </nav>
      {aside ? <span className="whitespace-nowrap text-s narrow:hidden">{aside}</span> : null}
    </div>
  );
}

/** The count after a tab's words. */
export function TabCount({ children }: { children: ReactNode }) {
  return <small>{children}</small>;
}
