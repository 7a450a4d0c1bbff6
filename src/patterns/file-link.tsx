import type { StoredFile } from '../../shared/patterns/patterns.schema.ts';

/** A file as it was uploaded, to take away again. */
export function FileLink({ file }: { file: StoredFile }) {
  return (
    <a
      href={`/api/files/${file.id}`}
      download={file.name}
      className="inline-flex min-h-11 items-center text-woad underline decoration-1 underline-offset-4 hover:decoration-2"
    >
      <span className="break-all">
        {file.name} <span className="whitespace-nowrap">({sayBytes(file.bytes)})</span>
      </span>
    </a>
  );
}

function sayBytes(bytes: number): string {
  if (bytes < 1000) return `${bytes} bytes`;
  if (bytes < 1_000_000) return `${(bytes / 1000).toFixed(1)} kB`;
  return `${(bytes / 1_000_000).toFixed(1)} MB`;
}
