import type { Metadata } from 'next';
import { cache } from 'react';
import { signedInPage } from '@/app/_shell/signed-in-page';
import { SignedInSheet } from '@/app/_shell/signed-in-sheet';
import { titleFor } from '@/app/_shell/title-for';
import { HistoryScreen } from '@/components/history/history-screen';
import { Fetched } from '@/components/shell/fetched';
import { ButtonLink } from '@/components/ui/button';
import { Caution } from '@/components/ui/caution';
import { can } from '@/lib/access';
import { PAGE_ROWS } from '@/lib/api/common';
import { PATHS } from '@/lib/client/api/paths';
import { layoutName } from '@/lib/server/layouts/document';
import { listChanges } from '@/lib/server/layouts/list-changes';
import { readChange } from '@/lib/server/layouts/read-change';
import { readLayout } from '@/lib/server/layouts/read-layout';

type Props = {
  params: Promise<{ layoutId: string }>;
  searchParams: Promise<{ version?: string | string[] }>;
};

const read = cache(readLayout);

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { layoutId } = await params;
  return {
    title: await titleFor('History', async (person) => {
      const { layout } = await read(person, layoutId);
      return `History of ${layoutName(layout.name)}`;
    }),
  };
}

export default async function HistoryPage({ params, searchParams }: Props) {
  const { layoutId } = await params;
  const { version } = await searchParams;
  return signedInPage(`/layouts/${layoutId}/history`, async (person) => {
    const layout = await read(person, layoutId);
    const [shown, changes] = await Promise.all([
      readChange(person, layoutId, shownVersion(version, layout.version)),
      listChanges(person, layoutId, { limit: PAGE_ROWS }),
    ]);
    const name = layoutName(layout.layout.name);
    return (
      <SignedInSheet
        person={person}
        title={`${layout.site.name}, ${name}`}
        status={<span className="text-alarm">DRAFT</span>}
        cells={[{ label: 'Version', value: String(layout.version) }]}
        caution={<Caution />}
      >
        <div className="flex flex-wrap items-end justify-between gap-4">
          <div>
            <h1 className="text-2xl font-bold">History of {name}</h1>
            <p>{layout.site.name}</p>
          </div>
          <span className="flex flex-wrap gap-3">
            <ButtonLink href={`/sites/${layout.site.id}`}>Back to the site</ButtonLink>
            <ButtonLink href={`/layouts/${layoutId}`} look="action">
              Open the drawing
            </ButtonLink>
          </span>
        </div>
        <Fetched firstPages={{ [PATHS.changes(layoutId)]: changes }}>
          <HistoryScreen
            layoutId={layoutId}
            newest={layout.version}
            version={{
              number: shown.version,
              layout: shown.layout,
              ground: layout.site.ground,
              limits: layout.limits,
            }}
            mayDraw={can(person.role, 'layout.draw')}
          />
        </Fetched>
      </SignedInSheet>
    );
  });
}

/** The version the address asks for; the newest where it asks for none that can be. */
function shownVersion(asked: string | string[] | undefined, newest: number): number {
  const version = Number(asked);
  return Number.isInteger(version) && version >= 1 && version <= newest ? version : newest;
}
