import type { Metadata } from 'next';
import { signedInPage } from '@/app/_shell/signed-in-page';
import { SignedInSheet } from '@/app/_shell/signed-in-sheet';
import { SitesScreen } from '@/components/sites/sites-screen';
import { can } from '@/lib/access';

export const metadata: Metadata = { title: 'Sites' };

export default function SitesPage() {
  return signedInPage('/sites', (person) => (
    <SignedInSheet person={person} title="Sites">
      <SitesScreen mayChange={can(person.role, 'site.change')} />
    </SignedInSheet>
  ));
}
