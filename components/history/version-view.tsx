import type { Layout, SiteGround } from '@/lib/layout';
import type { Limits } from '@/lib/limits';
import { PlanPicture } from './plan-picture';

/** What one version held, over the site's ground as it is known today. */
export type Version = { number: number; layout: Layout; ground: SiteGround; limits: Limits };

export function VersionView({ version }: { version: Version }) {
  const { number, layout, ground, limits } = version;
  const pieces = layout.pieces.length === 1 ? '1 piece' : `${layout.pieces.length} pieces`;
  return (
    <div className="mt-2">
      <PlanPicture
        layout={layout}
        ground={ground}
        limits={limits}
        describedAs={`Plan of version ${number}, ${pieces}, north up`}
      />
      <p className="mt-1 text-ink-soft">
        {pieces}, north up. Lines under the ground are shown as they are known today.
      </p>
    </div>
  );
}
