import { useNavigate } from 'react-router-dom';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { Notice } from '../ui/notice.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { useCopyPattern } from './queries.ts';

/** Makes another pattern with the same details and tables, and goes to it. */
export function CopyPattern({ patternId }: { patternId: string }) {
  const navigate = useNavigate();
  const copy = useCopyPattern(patternId);
  return (
    <>
      <Button
        kind="quiet"
        pending={copy.isPending}
        onClick={() => copy.mutate(undefined, { onSuccess: (made) => void navigate(paths.pattern(made.id)) })}
      >
        {copy.isPending ? 'Copying it' : 'Copy this pattern'}
      </Button>
      {copy.isError && (
        <div role="alert" className="order-last basis-full">
          <Notice kind="error">{failureWords(copy.error)}</Notice>
        </div>
      )}
    </>
  );
}
