'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { signIn } from 'next-auth/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { signInWords } from '@/lib/api/sign-in';
import { returnPath } from './return-path';

const entered = z.object({
  email: z.string().trim().min(1, { error: 'Enter your e-mail address.' }),
  password: z.string().min(1, { error: 'Enter your password.' }),
});

const UNREACHABLE =
  'The server can’t be reached. What you entered is still here: check the network and try again.';

/** `refused` is what next-auth's redirect says of an earlier try. `back` comes from the address and is only followed to a page of this server. */
export function SignInForm({ back, refused }: { back: string | null; refused: string | null }) {
  const [refusal, setRefusal] = useState(refused && signInWords(refused));
  const { register, handleSubmit, formState, resetField, setFocus } = useForm({
    resolver: zodResolver(entered),
    defaultValues: { email: '', password: '' },
  });

  const submit = handleSubmit(async ({ email, password }) => {
    setRefusal(null);
    const answer = await signIn('credentials', { email, password, redirect: false }).catch(
      () => null,
    );
    if (answer?.ok && !answer.error) {
      // A full load, so that nothing fetched for nobody stays in memory.
      window.location.assign(returnPath(back, window.location.origin));
      return;
    }
    setRefusal(answer ? signInWords(answer.error ?? 'unknown') : UNREACHABLE);
    if (answer) {
      resetField('password');
      setFocus('password');
    }
  });

  const leaving = formState.isSubmitSuccessful && !refusal;
  return (
    <form onSubmit={submit} noValidate className="flex max-w-md flex-col gap-5">
      {refusal && (
        <Notice kind="failed" title="Not signed in.">
          {refusal}
        </Notice>
      )}
      <Field label="E-mail" error={formState.errors.email?.message}>
        {(ties) => (
          <Input
            {...ties}
            {...register('email')}
            type="email"
            autoComplete="username"
            autoCapitalize="none"
            spellCheck={false}
          />
        )}
      </Field>
      <Field label="Password" error={formState.errors.password?.message}>
        {(ties) => (
          <Input
            {...ties}
            {...register('password')}
            type="password"
            autoComplete="current-password"
          />
        )}
      </Field>
      <div>
        <Button
          type="submit"
          look="action"
          size="field"
          disabled={formState.isSubmitting || leaving}
        >
          {formState.isSubmitting || leaving ? 'Signing in' : 'Sign in'}
        </Button>
      </div>
    </form>
  );
}
