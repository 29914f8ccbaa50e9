import { joinClasses } from './join-classes.ts';

/** Main is filled and stands once on a page; iron destroys; iron-filled only inside its own dialog; plain is a link. */
export type ButtonKind = 'outlined' | 'main' | 'iron' | 'iron-filled' | 'plain';

export type ButtonLook = { kind?: ButtonKind; small?: boolean };

/** The class names of a button or of a link that looks like one. */
export function buttonClasses({ kind = 'outlined', small = false }: ButtonLook, more?: string): string {
  return joinClasses('button', kind !== 'outlined' && `is-${kind}`, small && 'is-small', more);
}
