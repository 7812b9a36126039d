'use client';

import { useMemo } from 'react';
import { Problems } from '@/components/ui/problems';
import { useChange, useLayout } from '@/lib/client/api';
import { PlanPicture } from './plan-picture';

/** What one version held, over the site's ground as it is known today. */
export function VersionView({ layoutId, version }: { layoutId: string; version: number }) {
  const { data: change, error } = useChange(layoutId, version);
  const { data: now, error: failed } = useLayout(layoutId);
  const sheet = useMemo(
    () => change && now && { layout: change.layout, site: now.site.ground },
    [change, now],
  );
  const problem = error ?? failed;
  if (problem) return <Problems problem={problem} className="mt-2" />;
  if (!sheet || !now || !change) {
    return (
      <p role="status" className="mt-2 h-[26rem] border-2 border-ink p-4 lg:h-[34rem]">
        Fetching the version
      </p>
    );
  }
  const count = change.layout.pieces.length;
  return (
    <div className="mt-2">
      <PlanPicture
        sheet={sheet}
        limits={now.limits}
        describedAs={`Plan of version ${version}, ${count} pieces, north up`}
      />
      <p className="mt-1 text-ink-soft">
        {count === 1 ? '1 piece' : `${count} pieces`}, north up. Lines under the ground are shown as
        they are known today.
      </p>
    </div>
  );
}
