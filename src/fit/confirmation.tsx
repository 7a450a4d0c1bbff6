/** Where the server stands to what is drawn: the browser is only quicker. */
type ConfirmationState = 'asking' | 'same' | 'differs' | 'failed';

const WORDS: Record<ConfirmationState, string> = {
  asking: 'Asking the server',
  same: 'Confirmed by the server',
  differs: 'The server reckons otherwise: its plan is what is drawn. Load the page anew if this stays',
  failed: 'Reckoned in this browser; the server has not confirmed it',
};

interface ConfirmationProps {
  state: ConfirmationState;
  engine: string;
  onRetry: () => void;
}

export function Confirmation({ state, engine, onRetry }: ConfirmationProps) {
  return (
    <p className="flex min-h-11 items-center gap-x-4 text-note text-ink-2" data-confirmation={state}>
      <span>
        {WORDS[state]}
        {state === 'same' ? `, engine ${engine}.` : '.'}
      </span>
      {state === 'failed' && (
        <button type="button" className="min-h-11 font-semibold text-woad" onClick={onRetry}>
          <span className="changeable leading-tight">Ask again</span>
        </button>
      )}
    </p>
  );
}
