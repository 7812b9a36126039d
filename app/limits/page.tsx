import type { Metadata } from 'next';
import { signedInPage } from '@/app/_shell/signed-in-page';
import { SignedInSheet } from '@/app/_shell/signed-in-sheet';
import { Acceptance } from '@/components/limits/acceptance';
import { FixedNumbers } from '@/components/limits/fixed-numbers';
import { LimitTables } from '@/components/limits/limit-tables';
import { Caution } from '@/components/ui/caution';
import { When } from '@/components/ui/when';
import { limitsFrom } from '@/lib/limits';
import { readLimits } from '@/lib/server/limits/read-limits';

export const metadata: Metadata = { title: 'Limits' };

export default function LimitsPage() {
  return signedInPage('/limits', async (person) => {
    const { limits: set } = await readLimits(person);
    const { values } = limitsFrom(set?.values);
    return (
      <SignedInSheet
        person={person}
        title={set?.name ?? 'Limits, defaults'}
        cells={[{ label: 'Set', value: set ? `No. ${set.number}` : 'none yet' }]}
        caution={<Caution />}
      >
        <h1 className="text-2xl font-bold">Limits</h1>
        <p className="mt-2 max-w-[68ch]">
          The numbers that every check measures against.{' '}
          {set ? (
            <>
              Set no. {set.number} of {person.agencyName}, <When at={set.set_at} />
              {set.set_by && ` by ${set.set_by.name}`}.
            </>
          ) : (
            `${person.agencyName} has set none yet: these are the defaults.`
          )}{' '}
          A mark says how far each can be trusted before your authority has confirmed it.
        </p>
        <Acceptance acceptance={set?.acceptance ?? null} />
        <LimitTables values={values} />
        <FixedNumbers />
      </SignedInSheet>
    );
  });
}
