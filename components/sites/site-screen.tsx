import type { SiteAnswer } from '@/lib/api';
import { GroundSection } from './ground-section';
import { LayoutsSection } from './layouts-section';
import { formatPosition } from '@/lib/geo';
import { SitePreview } from './site-preview-lazy';
import { StartLayout } from './start-layout';

/** A site: what has been drawn there, how to start the next layout, what lies under it. */
export function SiteScreen({
  site,
  may,
}: {
  site: SiteAnswer;
  may: { change: boolean; draw: boolean };
}) {
  return (
    <>
      <h1 className="text-2xl font-bold">{site.name}</h1>
      <p>
        {site.where ?? 'Place not entered'}
        <span className="text-ink-soft">
          {site.at ? `, ${formatPosition(site.at, 'decimal')}` : ', position not entered'}
        </span>
      </p>
      {site.notes && <p className="mt-2 max-w-[68ch] whitespace-pre-line">{site.notes}</p>}
      <div className="mt-6 grid items-start gap-x-8 gap-y-8 lg:grid-cols-2">
        <div className="flex min-w-0 flex-col gap-8">
          <LayoutsSection siteId={site.id} />
          {may.draw && <StartLayout site={site} />}
        </div>
        <SitePreview site={site} />
      </div>
      <div className="mt-10">
        <GroundSection siteId={site.id} mayChange={may.change} />
      </div>
    </>
  );
}
