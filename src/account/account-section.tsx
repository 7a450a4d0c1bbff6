import type { ReactNode } from 'react';
import { SectionHeading } from '../ui/page-heading.tsx';

interface AccountSectionProps {
  id: string;
  title: string;
  lead: ReactNode;
  children: ReactNode;
}

/** A part of the account's page: what it is, then what is to be done. */
export function AccountSection({ id, title, lead, children }: AccountSectionProps) {
  return (
    <section aria-labelledby={id} className="border-t border-rule pt-5">
      <SectionHeading id={id}>{title}</SectionHeading>
      <div className="mt-1 mb-5 space-y-2 text-note text-ink-2">{lead}</div>
      {children}
    </section>
  );
}
