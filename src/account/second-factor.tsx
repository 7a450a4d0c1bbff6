import { useState } from 'react';
import type { Account } from '../../shared/account-answers.ts';
import { Button } from '../ui/button.tsx';
import { AskPassword } from './ask-password.tsx';
import { useEndSecondFactor, useNewRecoveryCodes } from './account-queries.ts';
import { KeepRecoveryCodes } from './recovery-codes.tsx';
import { SetUpSecondFactor } from './set-up-second-factor.tsx';

interface SecondFactorProps {
  account: Account;
  onDone: (words: string) => void;
}

/** The second factor: how to have one, and where it is on, fresh codes and the way off. */
export function SecondFactor({ account, onDone }: SecondFactorProps) {
  // Setting up ends in codes to keep, and by then the factor is on: what was begun is finished first.
  const [isSettingUp] = useState(!account.twoFactorEnabled);
  if (isSettingUp) return <SetUpSecondFactor isConfirmed={account.emailVerified} onDone={onDone} />;
  return <SecondFactorIsOn left={account.recoveryCodesLeft ?? 0} onDone={onDone} />;
}

function SecondFactorIsOn({ left, onDone }: { left: number; onDone: (words: string) => void }) {
  const [step, setStep] = useState<'choose' | 'codes' | 'off'>('choose');
  const [codes, setCodes] = useState<string[] | null>(null);
  const renew = useNewRecoveryCodes();
  const end = useEndSecondFactor();
  if (codes !== null) {
    return <KeepRecoveryCodes codes={codes} onKept={() => onDone('You have new recovery codes.')} />;
  }
  return (
    <div className="space-y-5">
      <p>
        Signing in asks for a code of your authenticator after the password. {sayLeft(left)} They stand in for
        the phone when it is lost.
      </p>
      {step === 'choose' && (
        <div className="flex flex-wrap gap-3">
          <Button onClick={() => setStep('codes')}>Make new recovery codes</Button>
          <Button onClick={() => setStep('off')}>Turn it off</Button>
        </div>
      )}
      {step === 'codes' && (
        <>
          <p>The codes before stop working as soon as new ones are made.</p>
          <AskPassword
            submit="Make new recovery codes"
            mutation={renew}
            onDone={({ backupCodes }) => setCodes(backupCodes)}
          />
        </>
      )}
      {step === 'off' && (
        <>
          <p>From then on the password alone lets somebody in.</p>
          <AskPassword
            submit="Turn it off"
            mutation={end}
            onDone={() => onDone('The second factor is off: the password alone is asked for.')}
          />
        </>
      )}
    </div>
  );
}

function sayLeft(left: number): string {
  if (left === 0) return 'You have no recovery code left: make new ones.';
  return left === 1 ? 'You have one recovery code left.' : `You have ${left} recovery codes left.`;
}
