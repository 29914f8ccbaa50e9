import type { ReactNode } from 'react';

type RuleHeadProps = {
  children: ReactNode;
  /** Faint italic at the right: "three lines of evidence". */
  aside?: ReactNode;
  level?: 2 | 3 | 4;
  /** The smaller setting, for a heading inside a page. */
  small?: boolean;
  id?: string;
};

/** A heading over a rule. */
export function RuleHead({ children, aside, small = false, level = small ? 3 : 2, id }: RuleHeadProps) {
  const Heading = `h${level}` as const;
  return (
    <div className="rule-head">
      <Heading id={id} className={small ? 'text-h4' : 'text-h3'}>
        {children}
      </Heading>
      {aside ? <span className="eyebrow">{aside}</span> : null}
    </div>
  );
}
