import type { Metadata } from 'next';
import { signedInPage } from '@/app/_shell/signed-in-page';
import { SignedInSheet } from '@/app/_shell/signed-in-sheet';
import { Handout } from '@/components/handout/handout';
import { HandoutBar } from '@/components/handout/handout-bar';
import { handoutChoice } from '@/components/handout/handout-choice';
import { handoutInput } from '@/components/handout/handout-input';
import { readLayout } from '@/lib/server/layouts/read-layout';

export const metadata: Metadata = { title: 'Handout' };

export default async function HandoutPage({
  params,
  searchParams,
}: {
  params: Promise<{ layoutId: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}) {
  const [{ layoutId }, asked] = await Promise.all([params, searchParams]);
  return signedInPage(`/layouts/${layoutId}/handout`, async (person) => {
    const answer = await readLayout(person, layoutId);
    const choice = handoutChoice(asked);
    const input = handoutInput(answer, new Date().toISOString());
    return (
      <SignedInSheet
        person={person}
        printBare
        title={answer.layout.name ?? 'Not named yet'}
        status="NOT APPROVED"
        cells={[{ label: 'Site', value: answer.site.name }]}
      >
        <h1 className="text-2xl font-bold print:hidden">Handout</h1>
        <p className="mb-4 mt-2 max-w-[68ch] print:hidden">
          The plan to scale with everything a crew needs to tape it out. Print at full size, not
          fitted to the page, and lay a ruler on the scale bar before anyone uses it.
        </p>
        <HandoutBar layoutId={layoutId} choice={choice} />
        <Handout input={input} choice={choice} />
      </SignedInSheet>
    );
  });
}
