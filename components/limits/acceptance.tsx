import { StatusMark } from '@/components/ui/status-mark';
import type { Acceptance as Accepted } from '@/lib/limits';

/** The one number that is never shipped: who takes a reading on it must have set it. */
export function Acceptance({ acceptance }: { acceptance: Accepted | null }) {
  return (
    <section aria-labelledby="acceptance" className="mt-6 max-w-[68ch] border-2 border-ink p-4">
      <h2 id="acceptance" className="text-lg font-bold">
        Acceptance resistance
      </h2>
      {acceptance ? (
        <p className="mt-1">
          <strong className="text-lg">A system is accepted below {acceptance.max_ohm} Ω</strong>,
          set by {acceptance.authority ?? 'an authority that was not entered'}. Lower is always
          better.
        </p>
      ) : (
        <p className="mt-1">
          <StatusMark status="not-known" className="text-lg font-bold">
            Not entered
          </StatusMark>
          <span className="block">
            The local authority’s value is needed before any layout can be approved. Figures in use
            differ widely, so none is filled in for you.
          </span>
        </p>
      )}
    </section>
  );
}
