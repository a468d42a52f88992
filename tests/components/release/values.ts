import { emptyReleaseForm, type ReleaseForm } from '@/components/forms/release/form-values';
import { releaseForm } from '@/tests/support/release';

/** The invented press note of 13 September as a reporter has typed it, on a race that is on file. */
export function typedForm(change: Partial<ReleaseForm> = {}): ReleaseForm {
  return { ...releaseForm(), race: { kind: 'existing', id: 'governor' }, ...change };
}

export function blankForm(change: Partial<ReleaseForm> = {}): ReleaseForm {
  return { ...emptyReleaseForm(), ...change };
}

export const row = (
  option: string,
  printed: string,
  change: Partial<ReleaseForm['shares'][number]> = {},
) => ({
  option,
  printed,
  notDisclosed: false,
  isAnswer: true,
  ...change,
});
