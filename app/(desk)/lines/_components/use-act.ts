'use client';

import { useRouter } from 'next/navigation';
import { useState, useTransition } from 'react';
import type { ActionResult } from '@/lib/errors';
import { useAction } from '../../../_components/use-action';

/** An act that moves a sheet on: once it is done it cannot be pressed again, and the page shows what came of it. */
export function useAct<Input, Value>(
  action: (input: Input) => Promise<ActionResult<Value>>,
  onDone: (value: Value) => void = () => undefined,
) {
  const router = useRouter();
  const { run, isPending, ...rest } = useAction(action);
  const [isDone, setDone] = useState(false);
  const [isLoading, startLoading] = useTransition();

  const act = async (input: Input): Promise<boolean> => {
    if (isPending || isDone) return false;
    const result = await run(input);
    if (!result.ok) return false;
    setDone(true);
    onDone(result.value);
    startLoading(() => router.refresh());
    return true;
  };

  return { act, isPending: isPending || isDone || isLoading, ...rest };
}
