import { Button } from '../ui/button.tsx';
import { ShownOnce } from '../ui/shown-once.tsx';

/** The recovery codes, told this once. */
export function KeepRecoveryCodes({ codes, onKept }: { codes: readonly string[]; onKept: () => void }) {
  return (
    <div className="space-y-6">
      <ShownOnce
        label="Your recovery codes"
        lines={codes}
        fileName="leeway-recovery-codes.txt"
        fileHead="Recovery codes for Leeway. Each lets you in once, in place of a code from your phone."
      >
        <p className="font-semibold">Keep these ten recovery codes where you find them without your phone.</p>
        <p>Each lets you in once when the phone is lost. They are shown now and never again.</p>
      </ShownOnce>
      <Button kind="primary" onClick={onKept}>
        I have kept them
      </Button>
    </div>
  );
}
