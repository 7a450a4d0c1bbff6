import { useEffect, useRef, useState } from 'react';
import { AskPassword } from './ask-password.tsx';
import { useBeginSecondFactor, useFinishSecondFactor } from './account-queries.ts';
import { CodeForm } from './code-form.tsx';
import { QrCode } from './qr-code.tsx';
import { KeepRecoveryCodes } from './recovery-codes.tsx';
import { keyToType } from './totp-key.ts';

interface Setup {
  totpURI: string;
  backupCodes: string[];
}

interface SetUpSecondFactorProps {
  isConfirmed: boolean;
  onDone: (words: string) => void;
}

/** Password, then the key into the authenticator, then its first code, then the recovery codes to keep. */
export function SetUpSecondFactor({ isConfirmed, onDone }: SetUpSecondFactorProps) {
  const [setup, setSetup] = useState<Setup | null>(null);
  const [isOn, setOn] = useState(false);
  const begin = useBeginSecondFactor();
  if (!isConfirmed) {
    return (
      <p>
        First confirm your e-mail address: the link is in the mail we sent you. Otherwise a mistyped address
        could lock you out for good.
      </p>
    );
  }
  if (setup === null) {
    return (
      <div className="space-y-5">
        <p>
          With a second factor, signing in asks for six digits that only your phone knows, after the password.
          You need an authenticator: an app on your phone, or a password manager that makes such codes.
        </p>
        <AskPassword submit="Begin" mutation={begin} onDone={setSetup} />
      </div>
    );
  }
  if (!isOn) return <TakeKey totpURI={setup.totpURI} onDone={() => setOn(true)} />;
  return (
    <StepFocus>
      <KeepRecoveryCodes
        codes={setup.backupCodes}
        onKept={() => onDone('The second factor is on. The next time you sign in, a code is asked for.')}
      />
    </StepFocus>
  );
}

function TakeKey({ totpURI, onDone }: { totpURI: string; onDone: () => void }) {
  const finish = useFinishSecondFactor();
  const key = keyToType(totpURI);
  return (
    <StepFocus>
      <ol className="space-y-8">
        <li>
          <h3 className="font-semibold">1. Give your authenticator the key</h3>
          <div className="mt-3 flex flex-wrap items-start gap-x-7 gap-y-4">
            <QrCode text={totpURI} label="The key as a square code for the camera of your phone" />
            <div className="min-w-0 max-w-72 grow basis-56 space-y-3">
              <p>Point its camera here, or type this key:</p>
              {key !== null && (
                <p className="bg-woad-tint px-3 py-2 font-semibold tracking-[0.04em] break-words select-all">
                  {key}
                </p>
              )}
              <p className="text-note">
                On the phone itself:{' '}
                <a href={totpURI} className="text-woad underline decoration-1 underline-offset-4">
                  open the authenticator
                </a>
              </p>
            </div>
          </div>
        </li>
        <li>
          <h3 className="mb-3 font-semibold">2. Write the code it shows</h3>
          <CodeForm kind="totp" submit="Turn it on" mutation={finish} onDone={onDone} />
        </li>
      </ol>
    </StepFocus>
  );
}

/** Puts the focus on a step that took the place of the one before, so that it is read from its beginning. */
function StepFocus({ children }: { children: React.ReactNode }) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => box.current?.focus(), []);
  return (
    <div ref={box} tabIndex={-1} className="outline-none">
      {children}
    </div>
  );
}
