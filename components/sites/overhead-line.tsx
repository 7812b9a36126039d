import { StatusMark } from '@/components/ui/status-mark';
import { When } from '@/components/ui/when';
import { piecesOf, type SiteGround } from '@/lib/layout';
import type { GroundDraft } from './ground-draft';

/** Overhead lines: drawn ones, or that someone looked and knows of none. */
export function OverheadLine({
  ground,
  edit,
}: {
  ground: SiteGround;
  edit: ((part: Partial<GroundDraft>) => void) | null;
}) {
  const lines = piecesOf(ground.features, 'overhead-line');
  const none = ground.overhead_none_known_as_of;
  return (
    <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule-faint py-2">
      {lines.length > 0 ? (
        <span>
          <strong>Overhead lines: {lines.length} drawn</strong>
          {lines.some((line) => line.volts === undefined) && ', voltage not known for all of them'}
        </span>
      ) : none ? (
        <>
          <StatusMark status="n/a" className="font-semibold">
            Overhead lines: none known
          </StatusMark>
          <span>
            as of <When at={none} />
          </span>
        </>
      ) : (
        <StatusMark status="not-known" className="font-semibold">
          Overhead lines: nobody has said that there are none
        </StatusMark>
      )}
      {edit && lines.length === 0 && (
        <label className="inline-flex min-h-11 items-center gap-2">
          <input
            type="checkbox"
            className="size-5"
            checked={none !== null}
            onChange={(event) =>
              edit({ overhead: event.target.checked ? new Date().toISOString() : null })
            }
          />
          We looked: none known as of now
        </label>
      )}
    </div>
  );
}
