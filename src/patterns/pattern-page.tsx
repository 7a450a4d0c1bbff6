import { PageHeading } from '../ui/page-heading.tsx';

/** Temporary: stands only until this page is written. */
export function Component() {
  return <PageHeading title="Pattern" />;
}
