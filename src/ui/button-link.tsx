import type { ReactNode } from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { buttonClasses, type ButtonLook } from './button-classes.ts';

type ButtonLinkProps = LinkProps & ButtonLook & { icon?: ReactNode };

/** A link that looks like a button: it leads somewhere and changes nothing. */
export function ButtonLink({ kind, small, icon, className, children, ...rest }: ButtonLinkProps) {
  return (
    <Link {...rest} className={buttonClasses({ kind, small }, className)}>
      {icon}
      {children}
    </Link>
  );
}
