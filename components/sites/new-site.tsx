'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field, Input } from '@/components/ui/field';
import { Problems } from '@/components/ui/problems';
import { createSite, Problem } from '@/lib/client/api';
import { parsePosition, quantise } from '@/lib/geo';

/** Null where nothing is entered: a site may be known before its place is. */
function placed(position: string): number[] | null {
  const read = parsePosition(position);
  return read.ok ? [...quantise(read.place)] : null;
}

function complaintAbout(position: string): string | true {
  if (position.trim() === '') return true;
  const read = parsePosition(position);
  return read.ok || read.message;
}

/** The button and the sheet on which a site is entered. */
export function NewSite({ first = false }: { first?: boolean }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button look="action" onClick={() => setOpen(true)}>
        {first ? 'Enter the first site' : 'New site'}
      </Button>
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title="New site"
        description="Only the name is needed now; the rest can be entered when it is known."
      >
        <NewSiteForm />
      </Dialog>
    </>
  );
}

function NewSiteForm() {
  const router = useRouter();
  const [problem, setProblem] = useState<Problem | null>(null);
  const { register, handleSubmit, formState } = useForm({
    defaultValues: { name: '', where: '', position: '' },
  });

  const submit = handleSubmit(async ({ name, where, position }) => {
    setProblem(null);
    try {
      const site = await createSite({
        name: name.trim(),
        where: where.trim() || null,
        at: placed(position),
      });
      router.push(`/sites/${site.id}`);
    } catch (cause) {
      if (!(cause instanceof Problem)) throw cause;
      setProblem(cause);
    }
  });

  const { errors } = formState;
  return (
    <form onSubmit={submit} noValidate className="flex flex-col gap-4">
      {problem && <Problems problem={problem} />}
      <Field label="Name" error={errors.name?.message}>
        {(ties) => (
          <Input
            {...ties}
            {...register('name', {
              validate: (value) => value.trim() !== '' || 'A site needs a name.',
            })}
            maxLength={200}
            autoComplete="off"
          />
        )}
      </Field>
      <Field
        label="County and place"
        hint="Road and milepost, yard, track"
        error={errors.where?.message}
      >
        {(ties) => <Input {...ties} {...register('where')} maxLength={300} autoComplete="off" />}
      </Field>
      <Field
        label="Position"
        hint="Latitude and longitude, or a US National Grid reference (WGS 84)"
        error={errors.position?.message}
      >
        {(ties) => (
          <Input
            {...ties}
            {...register('position', {
              validate: complaintAbout,
            })}
            inputMode="text"
            autoComplete="off"
            spellCheck={false}
          />
        )}
      </Field>
      <div>
        <Button type="submit" look="action" disabled={formState.isSubmitting}>
          {formState.isSubmitting ? 'Entering the site' : 'Enter the site'}
        </Button>
      </div>
    </form>
  );
}
