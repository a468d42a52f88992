import { zodResolver } from '@hookform/resolvers/zod';
import { type Resolver, useForm } from 'react-hook-form';
import { type ReleaseFormValues, releaseInput } from '@/lib/domain/release-input';
import type { Form } from './fields';
import type { ReleaseForm } from './form-values';

const check = zodResolver(releaseInput, undefined, { raw: true });
const resolver: Resolver<ReleaseForm> = (values, context, options) =>
  check(values as ReleaseFormValues, context, options as Parameters<typeof check>[2]) as ReturnType<
    Resolver<ReleaseForm>
  >;

/** The form's state, validated by what the service accepts. */
export function useReleaseForm(values: ReleaseForm): Form {
  return useForm<ReleaseForm>({ defaultValues: values, resolver, shouldFocusError: false });
}
