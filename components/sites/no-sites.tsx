import { NewSite } from './new-site';

/** Before the first site: what a site is, and why to enter it ahead of time. */
export function NoSites({ mayChange }: { mayChange: boolean }) {
  return (
    <div className="max-w-[68ch]">
      <h1 className="text-2xl font-bold">Sites</h1>
      <p className="mt-3 text-lg">There is no site yet.</p>
      <p className="mt-3">
        A site is a place where a transfer may have to be made: a rail siding, a ramp, a fuel yard.
        It keeps what outlives any one incident: the base map, the buried and overhead lines, the
        owners’ answers, the locate tickets and the fixed points that tapes are run from. Layouts
        are drawn on it.
      </p>
      <p className="mt-3">
        Enter the places you can foresee while there is time: a known site takes twenty minutes off
        the day it matters.
      </p>
      <div className="mt-6">
        {mayChange ? (
          <NewSite first />
        ) : (
          <p>A planner, a safety officer or an administrator can enter the first one.</p>
        )}
      </div>
    </div>
  );
}
