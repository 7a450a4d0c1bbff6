import { ProblemError } from '../../api/problem-error.ts';
import { JumpLink } from '../../ui/jump-link.tsx';
import { Notice } from '../../ui/notice.tsx';
import { failureWords } from '../../ui/use-server-errors.ts';
import type { TableEditing } from './use-table-edit.ts';

/** What keeps the tables from being saved: what is wrong in them, or why the server did not take them. */
export function SaveTrouble({ editing, error }: { editing: TableEditing; error: Error | null }) {
  const { errors, isAsked } = editing;
  if (isAsked && errors.length > 0) {
    return (
      <div role="alert" className="mb-5">
        <Notice kind="error" word="Not saved">
          <p>
            <JumpLink to="findings">
              {errors.length === 1 ? 'One error is to be mended' : `${errors.length} errors are to be mended`}
            </JumpLink>
            ; each is listed above and stands at its cell.
          </p>
        </Notice>
      </div>
    );
  }
  if (error === null) return null;
  const fields = error instanceof ProblemError ? error.fields.map(({ detail }) => detail) : [];
  return (
    <div role="alert" className="mb-5">
      <Notice kind="error" word="Not saved">
        {(fields.length > 0 ? [...new Set(fields)] : [failureWords(error)]).map((words) => (
          <p key={words}>{words}</p>
        ))}
      </Notice>
    </div>
  );
}
