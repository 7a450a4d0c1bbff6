import { TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { paths } from '../paths.ts';

/** No such page, or one that is not for this account: the two are not told apart. */
export function NotFoundPage() {
  return (
    <div className="max-w-[40rem]">
      <PageHeading title="There is nothing here" />
      <p className="mt-4">
        The address may be mistyped, or what stood here has been deleted. Start again from the{' '}
        <TextLink to={paths.home}>front page</TextLink>, your <TextLink to={paths.people}>people</TextLink> or
        your <TextLink to={paths.patterns}>patterns</TextLink>.
      </p>
    </div>
  );
}
