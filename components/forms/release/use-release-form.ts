import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { type FieldErrors, get, type Resolver, set, useForm } from 'react-hook-form';
import { type ReleaseFormValues, releaseInput } from '@/lib/domain/release-input';
import type { Policy } from '@/lib/findings/check-types';
import { engineFaults } from './engine-faults';
import { messageOf } from './field-path';
import type { Form } from './fields';
import type { ReleaseForm } from './form-values';

const check = zodResolver(releaseInput, undefined, { raw: true });

/** What the service would refuse, form and figures in one round. */
function resolverUnder(policy: Policy): Resolver<ReleaseForm> {
  return async (values, context, options) => {
    const typed = values as ReleaseFormValues;
    const result = await check(typed, context, options as Parameters<typeof check>[2]);
    const errors = { ...result.errors } as FieldErrors<ReleaseForm>;
    for (const { field, message } of engineFaults(values, policy))
      if (!messageOf(get(errors, field)))
        set(errors, field === 'shares' ? 'shares.root' : field, { type: 'engine', message });
    return Object.keys(errors).length === 0 ? { values, errors: {} } : { values: {}, errors };
  };
}

/** The form's state, validated by what the service accepts. */
export function useReleaseForm(values: ReleaseForm, policy: Policy): Form {
  const [resolver] = useState(() => resolverUnder(policy));
  return useForm<ReleaseForm>({ defaultValues: values, resolver, shouldFocusError: false });
}
