import type { ComponentProps } from 'react';
import { Link } from 'react-router-dom';
import { buttonClass, type ButtonKind } from './button.tsx';

/** A link in running text: underlined, so that it is one without its colour. */
export function TextLink({ className, ...rest }: ComponentProps<typeof Link>) {
  return (
    <Link
      {...rest}
      className={`text-woad underline decoration-1 underline-offset-4 hover:decoration-2 ${className ?? ''}`}
    />
  );
}

/** A link that stands as a button. */
export function ButtonLink({
  kind,
  className,
  children,
  ...rest
}: ComponentProps<typeof Link> & { kind?: ButtonKind }) {
  return (
    <Link {...rest} className={`${buttonClass(kind)} ${className ?? ''}`}>
      {kind === 'quiet' ? <span className="changeable leading-tight">{children}</span> : children}
    </Link>
  );
}
