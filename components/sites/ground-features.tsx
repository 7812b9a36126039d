import { CLASS_WORDS } from '@/lib/checks/buried-lines-known';
import { piecesOf, type SiteGround } from '@/lib/layout';
import { formatPosition } from '@/lib/geo';

/** What is drawn on the site, for reading: it is changed on the drawing. */
export function GroundFeatures({ ground }: { ground: SiteGround }) {
  const lines = piecesOf(ground.features, 'buried-line');
  const points = piecesOf(ground.features, 'fixed-point');
  const metal = piecesOf(ground.features, 'metal-line');
  const noDrive = piecesOf(ground.features, 'no-drive');
  const low = piecesOf(ground.features, 'low-ground');
  return (
    <div className="mt-8 grid gap-8 md:grid-cols-2">
      <section aria-labelledby="buried" className="min-w-0">
        <h3 id="buried" className="border-b border-ink font-bold">
          Buried lines drawn
        </h3>
        {lines.length === 0 && <p className="py-2">None is drawn. That is no proof of none.</p>}
        <ul>
          {lines.map((line) => (
            <li key={line.id} className="border-b border-rule-faint py-2">
              <strong>{CLASS_WORDS[line.utility]}</strong>
              {line.private && ', private'}
              <span className="block">
                {line.diameter_in === undefined ? 'diameter not known' : `${line.diameter_in} in`}
                {', '}
                {line.depth_ft === undefined ? 'depth not known' : `${line.depth_ft} ft deep`}
                {`, quality level ${line.quality ?? 'D'}, ${line.material ?? 'unknown'} material`}
                {line.owner && `, ${line.owner}`}
              </span>
            </li>
          ))}
        </ul>
      </section>
      <section aria-labelledby="fixed" className="min-w-0">
        <h3 id="fixed" className="border-b border-ink font-bold">
          Fixed points and ground
        </h3>
        {points.length === 0 && (
          <p className="py-2">
            No fixed point yet. Tapes need two that will still be there, such as a hydrant and a
            sign post: draw them on the plan.
          </p>
        )}
        <ul>
          {points.map((point) => (
            <li key={point.id} className="border-b border-rule-faint py-2">
              <strong>
                {[point.label, point.name].filter(Boolean).join(' ') || 'Fixed point'}
              </strong>
              <span className="block">{formatPosition(point.at, 'decimal')}</span>
            </li>
          ))}
          <Count count={metal.length} one="metal line" many="metal lines" />
          <Count
            count={noDrive.length}
            one="area where no rod can be driven"
            many="areas where no rod can be driven"
          />
          <Count
            count={low.length}
            one="low place where vapour gathers"
            many="low places where vapour gathers"
          />
        </ul>
      </section>
    </div>
  );
}

const Count = ({ count, one, many }: { count: number; one: string; many: string }) =>
  count === 0 ? null : (
    <li className="border-b border-rule-faint py-2">
      {count} {count === 1 ? one : many} drawn
    </li>
  );
