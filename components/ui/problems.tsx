import type { Problem } from '@/lib/client/api';
import { Notice } from './notice';

/**
 * A refused request as people should read it: what happened, what is kept, what to do next, every
 * fault with the path that leads to it, and the reference that the server's log has too.
 */
export function Problems({
  problem,
  title,
  className,
}: {
  problem: Problem;
  title?: string;
  className?: string;
}) {
  return (
    <Notice
      kind="failed"
      title={title ?? problem.details?.title ?? 'No answer from the server'}
      className={className}
    >
      <p>{problem.message}</p>
      {problem.faults.length > 0 && (
        <ul className="mt-2 max-h-80 overflow-y-auto" tabIndex={0} aria-label="Faults">
          {problem.faults.map((fault, index) => (
            <li key={`${fault.path} ${index}`} className="border-t border-rule py-1">
              <code className="break-all font-sans font-semibold">{fault.path || 'file'}</code>
              <span className="block">{fault.message}</span>
            </li>
          ))}
        </ul>
      )}
      {problem.reference && <p className="mt-1 text-ink-soft">Reference {problem.reference}</p>}
    </Notice>
  );
}
