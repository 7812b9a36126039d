'use client';

import { useState } from 'react';
import { requestSignOut } from '@/components/sign-in/auth-requests';

/** Ends the session on the server, then shows the sign-in. Says so when the server can't be told. */
export function SignOut() {
  const [state, setState] = useState<'ready' | 'busy' | 'failed'>('ready');
  async function leave() {
    setState('busy');
    try {
      await requestSignOut();
      // A full load, so that nothing of this person's stays in memory.
      window.location.assign('/sign-in?after=sign-out');
    } catch {
      setState('failed');
    }
  }
  return (
    <>
      <button
        type="button"
        onClick={leave}
        disabled={state === 'busy'}
        className="inline-flex min-h-11 cursor-pointer items-center underline underline-offset-4"
      >
        {state === 'busy' ? 'Signing out' : 'Sign out'}
      </button>
      {state === 'failed' && (
        <span role="alert" className="font-semibold text-alarm">
          Still signed in: the server can’t be reached. Try again.
        </span>
      )}
    </>
  );
}
