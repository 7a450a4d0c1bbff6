import { useState } from 'react';
import type { FitRequest } from '../../shared/plans/plans.schema.ts';
import { useSavePlan } from '../plans/queries.ts';
import { NameForm } from '../plans/parts/name-form.tsx';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { TextLink } from '../ui/link.tsx';

interface SavePlanProps {
  request: FitRequest;
  /** A name to begin with. */
  name: string;
  /** Only what the server has answered is saved: what one saves is what one sees. */
  isReady: boolean;
}

/** Keeps the plan under a name. The form opens where the button stood. */
export function SavePlan({ request, name, isReady }: SavePlanProps) {
  const [isOpen, setOpen] = useState(false);
  const save = useSavePlan();
  if (isOpen) {
    return (
      <NameForm
        label="Name of the plan"
        name={name}
        confirm="Save"
        cancel="Not now"
        isPending={save.isPending}
        error={save.error}
        onName={(chosen) => save.mutate({ ...request, name: chosen }, { onSuccess: () => setOpen(false) })}
        onCancel={() => {
          setOpen(false);
          save.reset();
        }}
      />
    );
  }
  return (
    <div className="flex flex-wrap items-center">
      <Button kind="primary" disabled={!isReady} onClick={() => setOpen(true)}>
        {save.isSuccess ? 'Save as another plan' : 'Save this plan'}
      </Button>
      <p role="status">
        {save.isSuccess && (
          <span className="ml-5">
            Saved. <TextLink to={paths.plan(save.data.id)}>Open {save.data.name}</TextLink>
          </span>
        )}
      </p>
    </div>
  );
}
