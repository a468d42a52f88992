'use client';

import { signOut } from 'next-auth/react';
import { useState } from 'react';

/** Ends the session and loads a whole new page, so that nothing of the desk stays in this one. */
export function SignOut() {
  const [state, setState] = useState<'ready' | 'working' | 'failed'>('ready');

  const leave = async () => {
    setState('working');
    try {
      await signOut({ callbackUrl: '/sign-in?notice=signed-out' });
    } catch {
      setState('failed');
    }
  };

  return (
    <>
      <button
        type="button"
        className="py-1 underline underline-offset-[0.18em] hover:decoration-2"
        aria-disabled={state === 'working' || undefined}
        onClick={state === 'working' ? undefined : leave}
      >
        {state === 'working' ? 'Signing out…' : 'Sign out'}
      </button>
      <p role="status" className="text-caution">
        {state === 'failed' ? 'Leadline did not answer: you are still signed in. Try again.' : ''}
      </p>
    </>
  );
}
