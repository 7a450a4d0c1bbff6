import type { ReactNode } from 'react';

/** What stands where nothing is yet: what belongs here, why it is worth having, and the first step. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: string;
  children: ReactNode;
  action?: ReactNode;
}) {
  return (
    <div className="mt-8 max-w-[38rem] border-t-2 border-ink pt-1">
      <div className="border-t-2 border-dashed border-woad pt-6">
        <h2 className="text-section font-semibold">{title}</h2>
        <div className="mt-2 space-y-3 text-ink-2">{children}</div>
        {action !== undefined && <p className="mt-6 flex flex-wrap gap-3">{action}</p>}
      </div>
    </div>
  );
}
