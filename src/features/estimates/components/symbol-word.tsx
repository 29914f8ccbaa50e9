import type { ReactNode } from 'react';

/** The letters of symbols that are not one letter, as they are set: KIc is K with Ic below the line. */
const set: Readonly<Record<string, ReactNode>> = {
  KIc: (
    <>
      <var>K</var>
      <sub>Ic</sub>
    </>
  ),
};

/** A quantity's symbol in italics. */
export function SymbolWord({ symbol }: { symbol: string }) {
  return set[symbol] ?? <var>{symbol}</var>;
}
