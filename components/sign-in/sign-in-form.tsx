'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { useReady } from '@/components/ui/use-ready';
import { signInWords } from '@/lib/api/sign-in';
import { requestSignIn } from './auth-requests';
import { returnPath } from './return-path';

const filled = (error: string) => z.string({ error }).min(1, { error });

const entered = z.object({
  email: filled('Enter your e-mail address.'),
  password: filled('Enter your password.'),
});

const UNREACHABLE =
  'The server can’t be reached. What you entered is still here: check the network and try again.';

/**
 * `refused` is the code of an earlier refusal, `back` the page asked for; both come from the
 * address, so the first is only translated and the second only followed to a page of ours.
 */
export function SignInForm({ back, refused }: { back: string | null; refused: string | null }) {
  const [refusal, setRefusal] = useState(refused && signInWords(refused));
  const ready = useReady();
  const { register, handleSubmit, formState, resetField, setFocus } = useForm({
    resolver: zodResolver(entered),
  });

  const submit = handleSubmit(async ({ email, password }) => {
    setRefusal(null);
    try {
      const refused = await requestSignIn(email, password);
      if (refused === null) {
        // A full load, so that nothing fetched for nobody stays in memory.
        window.location.assign(returnPath(back, window.location.origin));
        return;
      }
      setRefusal(signInWords(refused));
      resetField('password');
      setFocus('password');
    } catch {
      setRefusal(UNREACHABLE);
    }
  });

  const leaving = formState.isSubmitSuccessful && !refusal;
  return (
    // Sent before the page is ready, a form must not put the password into the address: so, post.
    <form method="post" onSubmit={submit} noValidate className="flex max-w-md flex-col gap-5">
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
          disabled={!ready || formState.isSubmitting || leaving}
        >
          {formState.isSubmitting || leaving ? 'Signing in' : 'Sign in'}
        </Button>
      </div>
    </form>
  );
}
