import type { Metadata } from 'next';
import { cache } from 'react';
import { signedInPage } from '@/app/_shell/signed-in-page';
import { titleFor } from '@/app/_shell/title-for';
import { SignedInSheet } from '@/app/_shell/signed-in-sheet';
import { SiteScreen } from '@/components/sites/site-screen';
import { Caution } from '@/components/ui/caution';
import { Fetched } from '@/components/shell/fetched';
import { can } from '@/lib/access';
import { PAGE_ROWS } from '@/lib/api/common';
import { PATHS } from '@/lib/client/api/paths';
import { listLayouts } from '@/lib/server/layouts/list-layouts';
import { readGround } from '@/lib/server/sites/read-ground';
import { readSite } from '@/lib/server/sites/read-site';

type Props = { params: Promise<{ siteId: string }> };

const read = cache(readSite);

/** The site's name; whatever keeps it from being read is told by the page itself. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { siteId } = await params;
  return { title: await titleFor('Site', async (person) => (await read(person, siteId)).name) };
}

export default async function SitePage({ params }: Props) {
  const { siteId } = await params;
  return signedInPage(`/sites/${siteId}`, async (person) => {
    const [site, ground, layouts] = await Promise.all([
      read(person, siteId),
      readGround(person, siteId),
      listLayouts(person, siteId, { limit: PAGE_ROWS }),
    ]);
    return (
      <SignedInSheet person={person} title={site.name} caution={<Caution />}>
        <Fetched
          answers={{ [PATHS.ground(siteId)]: ground }}
          firstPages={{ [PATHS.layouts(siteId)]: layouts }}
        >
          <SiteScreen
            site={site}
            may={{ change: can(person.role, 'site.change'), draw: can(person.role, 'layout.draw') }}
          />
        </Fetched>
      </SignedInSheet>
    );
  });
}
