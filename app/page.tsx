import { ExamplePlan } from '@/app/_front/example-plan';
import { PublicNav } from '@/components/shell/public-nav';
import { SignedInNav } from '@/components/shell/signed-in-nav';
import { ButtonLink } from '@/components/ui/button';
import { Caution } from '@/components/ui/caution';
import { SheetFrame } from '@/components/ui/sheet-frame';
import type { Role } from '@/lib/access';
import { isDatabaseAway } from '@/lib/server/problems';
import { currentPerson } from '@/lib/server/session';

const JOB = [
  {
    title: 'Draw it before anyone approaches',
    words:
      'The casualty vehicle, the receiving vehicle and the pump to true size on the map of the site; rods, jumpers, cables, probes and the tester from the kit that is on the truck.',
  },
  {
    title: 'See what is wrong, and what is not known',
    words:
      'Spacing, wind, slope, hot zone, buried and overhead lines and the reach of every cable are checked as you draw, against the limits your agency has set. What nobody has answered is never counted as met.',
  },
  {
    title: 'Hand over a sheet the crew can tape out',
    words:
      'The plan to scale with distances and bearings, the checks, and a numbered blank for everything that still has to be found out on the ground.',
  },
] as const;

export default async function FrontPage() {
  const person = await signedInAlready();
  return (
    <SheetFrame
      nav={person ? <SignedInNav me={person} /> : <PublicNav />}
      title="Stillground"
      cells={[
        { label: 'For', value: 'hazmat teams' },
        { label: 'Verdicts by', value: 'your agency’s limits' },
      ]}
      caution={<Caution />}
    >
      <div className="grid items-start gap-10 xl:grid-cols-2">
        <div className="max-w-[68ch]">
          <h1 className="text-2xl font-bold leading-tight sm:text-3xl">
            Where the rods go, before anyone goes there
          </h1>
          <p className="mt-4 text-lg">
            A flammable liquid may only leave a damaged tank once three separate ground systems
            stand, have been measured and are connected: one for the casualty vehicle, one for the
            receiving vehicle, one for the pump. The wind shifts, the lines under the soil cannot be
            seen, and there is little time. Stillground settles on a map where each thing goes,
            whether it may go there and whether the kit reaches.
          </p>
          <div className="mt-6 flex flex-wrap items-center gap-4">
            {person ? (
              <ButtonLink href="/sites" look="action">
                Go to the sites
              </ButtonLink>
            ) : (
              <ButtonLink href="/sign-in" look="action">
                Sign in
              </ButtonLink>
            )}
            <ButtonLink href="/blank-readings">Print a blank readings page</ButtonLink>
          </div>
          <p className="mt-2 text-ink-soft">The blank page needs no sign-in.</p>
        </div>
        <ExamplePlan />
      </div>
      <ol className="mt-10 grid gap-x-8 border-t border-rule md:grid-cols-3">
        {JOB.map((step, index) => (
          <li key={step.title} className="border-b border-rule-faint py-4 md:border-b-0">
            <h2 className="text-lg font-bold">
              <span className="mr-2 text-ink-soft">{index + 1}</span>
              {step.title}
            </h2>
            <p className="mt-1">{step.words}</p>
          </li>
        ))}
      </ol>
    </SheetFrame>
  );
}

/** This page needs no database: without one it is shown as to anyone. */
async function signedInAlready(): Promise<{ name: string; role: Role } | null> {
  try {
    const person = await currentPerson();
    return person && { name: person.name, role: person.role };
  } catch (error) {
    if (isDatabaseAway(error)) return null;
    throw error;
  }
}
