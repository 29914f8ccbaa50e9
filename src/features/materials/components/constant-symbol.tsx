import { constantKindTable, type ConstantKind } from '#shared/vocabulary/constant-kinds.ts';

/** The symbol of a constant as set in print: italic letter, upright index. */
export function ConstantSymbol({ kind }: { kind: ConstantKind }) {
  const [letter, index] = constantKindTable[kind].symbol.split('_');
  return (
    <>
      <var>{letter}</var>
      {index ? <sub>{index}</sub> : null}
    </>
  );
}
