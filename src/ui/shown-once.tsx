import { useRef, useState, type ReactNode } from 'react';
import { Button } from './button.tsx';
import { saveFile } from './save-file.ts';

interface ShownOnceProps {
  /** What it is: “Your recovery codes”. */
  label: string;
  /** One entry a line. */
  lines: readonly string[];
  fileName: string;
  /** Stands in the file over the lines, so that whoever finds it knows what it is. */
  fileHead: string;
  /** What is to be done with it. */
  children: ReactNode;
}

/** A secret that is told this once: to be copied, saved as a file, or written down. */
export function ShownOnce({ label, lines, fileName, fileHead, children }: ShownOnceProps) {
  const [said, setSaid] = useState('');
  const text = useRef<HTMLPreElement>(null);
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(lines.join('\n'));
      setSaid('Copied.');
    } catch {
      // Without https, or where the browser forbids it: select it, so that the keyboard's own copy works.
      if (text.current) window.getSelection()?.selectAllChildren(text.current);
      setSaid('The browser did not let us copy. It is selected: copy it with the keyboard.');
    }
  };
  const save = () => {
    saveFile(new Blob([`${fileHead}\n\n${lines.join('\n')}\n`], { type: 'text/plain' }), fileName);
    setSaid(`Saved as ${fileName}.`);
  };
  return (
    <div className="border-t-2 border-ink">
      <div className="border-t-2 border-dashed border-woad pt-5 mt-1">
        <div className="space-y-2">{children}</div>
        <pre
          ref={text}
          aria-label={label}
          tabIndex={0}
          role="group"
          className={`mt-4 bg-woad-tint px-4 py-3 font-sans text-lead leading-loose font-semibold break-all whitespace-pre-wrap select-all ${
            lines.length > 1 ? 'sm:columns-2' : ''
          }`}
        >
          {lines.join('\n')}
        </pre>
        <div className="mt-4 flex flex-wrap items-center gap-x-7 gap-y-2">
          <Button onClick={() => void copy()}>Copy</Button>
          <Button onClick={save}>Save as a file</Button>
          <span role="status" className="text-note text-ink-2">
            {said}
          </span>
        </div>
      </div>
    </div>
  );
}
