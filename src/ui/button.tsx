import type { ComponentProps } from 'react';

/** `primary`: the one thing to do here. `plain`: any other. `quiet`: in a row of text. */
export type ButtonKind = 'primary' | 'plain' | 'quiet';

const SHAPE =
  'inline-flex min-h-11 items-center justify-center text-base font-semibold no-underline text-center';
const LOOK: Record<ButtonKind, string> = {
  primary: 'px-5 border-2 border-woad bg-woad text-paper hover:bg-ink hover:border-ink',
  plain: 'px-5 border-2 border-ink text-ink hover:bg-ink hover:text-paper',
  quiet: 'text-woad hover:text-ink',
};

/** The classes of a button, for links that look like one. */
export const buttonClass = (kind: ButtonKind = 'plain') => `${SHAPE} ${LOOK[kind]} print:hidden`;

type ButtonProps = ComponentProps<'button'> & {
  kind?: ButtonKind;
  /** While what it started is under way: it keeps the focus but does nothing more. */
  pending?: boolean;
};

export function Button({
  kind = 'plain',
  pending = false,
  children,
  onClick,
  className,
  ...rest
}: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      aria-disabled={pending || undefined}
      onClick={(event) => {
        if (pending) event.preventDefault();
        else onClick?.(event);
      }}
      className={`${buttonClass(kind)} disabled:opacity-50 aria-disabled:opacity-60 ${className ?? ''}`}
    >
      {kind === 'quiet' ? <span className="changeable leading-tight">{children}</span> : children}
    </button>
  );
}
