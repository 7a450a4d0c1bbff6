import type { ReactNode } from 'react';
import { Button } from '../ui/button.tsx';

/** What opens under the sentence when one of its words is to be changed. */
export function ChangePart({
  id,
  title,
  onClose,
  children,
}: {
  id: string;
  title: string;
  onClose: () => void;
  children: ReactNode;
}) {
  return (
    <section
      id={id}
      aria-labelledby={`${id}-title`}
      className="mt-8 max-w-[38rem] border-l-2 border-dashed border-woad pl-5 sm:pl-7"
    >
      <div className="mb-4 flex flex-wrap items-baseline justify-between gap-x-6">
        <h2 id={`${id}-title`} className="text-section font-semibold">
          {title}
        </h2>
        <Button kind="quiet" onClick={onClose}>
          Leave it
        </Button>
      </div>
      {children}
    </section>
  );
}
