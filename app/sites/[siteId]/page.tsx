import type { Metadata } from 'next';
import { signedInPage } from '@/app/_shell/signed-in-page';
import { SignedInSheet } from '@/app/_shell/signed-in-sheet';
import { SiteScreen } from '@/components/sites/site-screen';
import { Caution } from '@/components/ui/caution';
import { can } from '@/lib/access';
import { readSite } from '@/lib/server/sites/read-site';

export const metadata: Metadata = { title: 'Site' };

export default async function SitePage({ params }: { params: Promise<{ siteId: string }> }) {
  const { siteId } = await params;
  return signedInPage(`/sites/${siteId}`, async (person) => {
    const site = await readSite(person, siteId);
    return (
      <SignedInSheet person={person} title={site.name} caution={<Caution />}>
        <SiteScreen
          site={site}
          may={{ change: can(person.role, 'site.change'), draw: can(person.role, 'layout.draw') }}
        />
      </SignedInSheet>
    );
  });
}
