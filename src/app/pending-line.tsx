import { useNavigation } from 'react-router-dom';

/** A running stitch along the top while the next page is fetched. */
export function PendingLine() {
  const isPending = useNavigation().state !== 'idle';
  return (
    <div role="status" className="print:hidden">
      {isPending && (
        <>
          <span className="sr-only">Loading</span>
          <svg aria-hidden="true" className="come-in-late fixed inset-x-0 top-0 z-20 h-1 w-full text-woad">
            <line
              x1="0"
              y1="2"
              x2="100%"
              y2="2"
              stroke="currentColor"
              strokeWidth="3"
              strokeDasharray="16 10"
              className="run-stitch"
            />
          </svg>
        </>
      )}
    </div>
  );
}
