import { Fragment } from 'react';
import { SymbolWord } from './symbol-word.tsx';

/** Text with units and symbols as they are set: the ½ of MPa m½ raised, KIc with its letters below the line. */
export function SetText({ text }: { text: string }) {
  return text.split(/(m½|KIc)/).map((part, index) => (
    <Fragment key={index}>
      {part === 'm½' ? (
        <>
          m<sup>½</sup>
        </>
      ) : part === 'KIc' ? (
        <SymbolWord symbol="KIc" />
      ) : (
        part
      )}
    </Fragment>
  ));
}
