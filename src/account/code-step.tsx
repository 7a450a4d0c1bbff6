import { useState } from 'react';
import { Button } from '../ui/button.tsx';
import { CodeForm, type CodeKind } from './code-form.tsx';
import { codeWords } from './enter-error.ts';
import { EnterPage } from './enter-page.tsx';
import { useSendCode } from './use-enter.ts';

/** The second step of signing in: a code of the authenticator, or a recovery code. */
export function CodeStep({ onStartOver }: { onStartOver: () => void }) {
  const [kind, setKind] = useState<CodeKind>('totp');
  const send = useSendCode(kind);
  const isTotp = kind === 'totp';
  return (
    <EnterPage
      title={isTotp ? 'Now the code' : 'A recovery code'}
      isLaterStep
      lead={
        <p>
          {isTotp
            ? 'The password is right. Your account asks for a second factor too.'
            : 'It stands in for your phone, this once.'}
        </p>
      }
    >
      <CodeForm key={kind} kind={kind} submit="Sign in" mutation={send} words={codeWords} />
      <p className="mt-7 flex flex-wrap gap-x-7">
        <Button
          kind="quiet"
          onClick={() => {
            send.reset();
            setKind(isTotp ? 'recovery' : 'totp');
          }}
        >
          {isTotp ? 'Use a recovery code' : 'Use the authenticator'}
        </Button>
        <Button kind="quiet" onClick={onStartOver}>
          Begin again
        </Button>
      </p>
    </EnterPage>
  );
}
