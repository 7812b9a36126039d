import type { Metadata } from 'next';
import { signedInPage } from '@/app/_shell/signed-in-page';
import { SignedInSheet } from '@/app/_shell/signed-in-sheet';
import { SitesScreen } from '@/components/sites/sites-screen';
import { Fetched } from '@/components/shell/fetched';
import { can } from '@/lib/access';
import { PAGE_ROWS } from '@/lib/api/common';
import { PATHS } from '@/lib/client/api/paths';
import { listSites } from '@/lib/server/sites/list-sites';

export const metadata: Metadata = { title: 'Sites' };

export default function SitesPage() {
  return signedInPage('/sites', async (person) => {
    const sites = await listSites(person, { limit: PAGE_ROWS });
    return (
      <SignedInSheet person={person} title="Sites">
        <Fetched firstPages={{ [PATHS.sites]: sites }}>
          <SitesScreen mayChange={can(person.role, 'site.change')} />
        </Fetched>
      </SignedInSheet>
    );
  });
}
