import type { Problem } from '@/lib/client/api';
import { Notice } from './notice';

/**
 * A refused request as people should read it: what happened, what is kept, what to do next, every
 * fault with the path that leads to it, and the reference that the server's log has too.
 */
export function Problems({
  problem,
  title,
  pathsWithin = '',
  className,
}: {
  problem: Problem;
  /** Says it all: replaces the server's own title and message. */
  title?: string;
  /** What every path begins with and nobody needs to read: where the file stood in the request. */
  pathsWithin?: string;
  className?: string;
}) {
  return (
    <Notice
      kind="failed"
      title={title ?? problem.details?.title ?? 'No answer from the server'}
      className={className}
    >
      {!title && <p>{problem.message}</p>}
      {problem.faults.length > 0 && (
        <ul className="mt-2 max-h-80 overflow-y-auto" tabIndex={0} aria-label="Faults">
          {problem.faults.map((fault, index) => (
            <li key={`${fault.path} ${index}`} className="border-t border-rule py-1">
              <code className="break-all font-sans font-semibold">
                {shortPath(fault.path, pathsWithin)}
              </code>
              <span className="block">{fault.message}</span>
            </li>
          ))}
        </ul>
      )}
      {problem.reference && <p className="mt-1 text-ink-soft">Reference {problem.reference}</p>}
    </Notice>
  );
}

function shortPath(path: string, within: string): string {
  if (within && path === within) return 'the file';
  return path.startsWith(`${within}.`) ? path.slice(within.length + 1) : path || 'the file';
}
