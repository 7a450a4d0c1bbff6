import type { ReactNode } from 'react';

/** Brings what has this id into the middle of the view and gives it the focus; opens what it is folded into. */
export function jumpTo(id: string) {
  const target = document.getElementById(id);
  if (!target) return;
  const folded = target.closest('details');
  if (folded) folded.open = true;
  target.focus({ preventScroll: true });
  target.scrollIntoView({ block: 'center', inline: 'center' });
}

/** A link to another place on the same page. The address stays: a change of it would be a navigation. */
export function JumpLink({
  to,
  className,
  tabIndex,
  children,
}: {
  to: string;
  className?: string;
  /** −1 where the way to it is another, as in a grid. */
  tabIndex?: -1;
  children: ReactNode;
}) {
  return (
    <a
      href={`#${to}`}
      tabIndex={tabIndex}
      className={`underline decoration-1 underline-offset-4 hover:decoration-2 ${className ?? ''}`}
      onClick={(event) => {
        event.preventDefault();
        jumpTo(to);
      }}
    >
      {children}
    </a>
  );
}
