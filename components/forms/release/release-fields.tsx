'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { type FormEvent, useCallback, useEffect, useState } from 'react';
import { type FieldPath, type Resolver, useForm, useFormState, useWatch } from 'react-hook-form';
import { type ReleaseFormValues, releaseInput } from '@/lib/domain/release-input';
import { Button } from '../../ui/button';
import { ErrorSummary } from '../../ui/error-summary';
import { DatesGroup } from './dates-group';
import { DraftLine } from './draft-line';
import { faultsOf } from './field-path';
import type { Form } from './fields';
import type { FormChoices } from './form-choices';
import { emptyReleaseForm, pruned, type ReleaseForm } from './form-values';
import { LiveProvider } from './live';
import { LivePanel } from './live-panel';
import { QuestionGroup, SourceGroup } from './question-groups';
import { RaceGroup } from './race-group';
import { PollsterGroup, SampleGroup, SizeGroup } from './sample-groups';
import { SharesGrid } from './shares-grid';
import { newSubmissionKey } from './submission-key';
import { useDraft } from './use-draft';

type Answer =
  | { ok: true; value: { id: string } }
  | { ok: false; code: string; message: string; fields: Record<string, string> };
export type SubmitRelease = (input: unknown) => Promise<Answer>;

const UNSENT =
  'The release could not be sent: Leadline cannot be reached, or was renewed meanwhile. What you typed is still here and in the draft; reload the page if it happens again.';

const check = zodResolver(releaseInput, undefined, { raw: true });
const resolver: Resolver<ReleaseForm> = (values, context, options) =>
  check(values as ReleaseFormValues, context, options as Parameters<typeof check>[2]) as ReturnType<
    Resolver<ReleaseForm>
  >;

/** The form itself, findings beside it on wide screens and beneath it on narrow ones. */
export function ReleaseFields({
  choices,
  personId,
  submit,
  initial,
}: {
  choices: FormChoices;
  personId: string;
  submit: SubmitRelease;
  initial: { values: ReleaseForm; savedAt: number | null };
}) {
  const form = useForm<ReleaseForm>({ defaultValues: initial.values, resolver, shouldFocusError: false });
  const [submissionKey, setSubmissionKey] = useState(newSubmissionKey);
  const [attempt, setAttempt] = useState(0);
  const [restoredAt, setRestoredAt] = useState(initial.savedAt);
  const router = useRouter();
  const { getValues, subscribe } = form;
  const draft = useDraft(useCallback(() => getValues(), [getValues]));
  const { changed } = draft;
  useEffect(() => subscribe({ formState: { values: true }, callback: changed }), [subscribe, changed]);

  async function send(values: ReleaseForm) {
    await draft.stop();
    const answer = await submit({ submissionKey, release: values }).catch((): Answer => ({
      ok: false,
      code: 'unreachable',
      message: UNSENT,
      fields: {},
    }));
    if (answer.ok) return router.push(`/releases/${answer.value.id}`);
    draft.resume();
    showRefusal(form, answer);
    setAttempt((count) => count + 1);
  }

  function onSubmit(event: FormEvent) {
    const values = pruned(getValues());
    form.setValue('shares', values.shares);
    form.setValue('race', values.race);
    form.setValue('modelledInterval', values.modelledInterval);
    void form.handleSubmit(send, () => setAttempt((count) => count + 1))(event);
  }

  async function discard() {
    if (!(await draft.discard())) return;
    form.reset(emptyReleaseForm());
    setSubmissionKey(newSubmissionKey());
    setRestoredAt(null);
  }

  return (
    <LiveProvider control={form.control} choices={choices} personId={personId}>
      <div className="grid gap-x-10 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)] xl:grid-cols-[minmax(0,1fr)_minmax(0,30rem)]">
        <form noValidate onSubmit={onSubmit} aria-label="Release" className="min-w-0 max-w-form">
          <DraftLine status={draft.status} restoredAt={restoredAt} onDiscard={discard} />
          <Faults form={form} attempt={attempt} />
          <RaceGroup form={form} races={choices.races} />
          <PollsterGroup form={form} pollsters={choices.pollsters} sponsors={choices.sponsors} />
          <SampleGroup form={form} />
          <DatesGroup form={form} zone={choices.zone} />
          <SizeGroup form={form} />
          <QuestionGroup form={form} />
          <SharesGrid form={form} />
          <SourceGroup form={form} />
          <Send form={form} />
        </form>
        <Beside form={form} level={choices.policy.level} />
      </div>
    </LiveProvider>
  );
}

/** A refusal of the service, at its fields; the whole form's is told on top. */
function showRefusal(form: Form, { message, fields }: Extract<Answer, { ok: false }>) {
  const faults = Object.entries(fields).map(([path, text]) => [path.replace(/^release\./, ''), text]);
  for (const [path, text] of faults)
    form.setError(path ? (path as FieldPath<ReleaseForm>) : 'root.server', { type: 'server', message: text });
  if (faults.length === 0) form.setError('root.server', { type: 'server', message });
}

function Faults({ form, attempt }: { form: Form; attempt: number }) {
  const { errors } = useFormState({ control: form.control });
  return <ErrorSummary faults={attempt === 0 ? [] : faultsOf(errors)} attempt={attempt} />;
}

function Send({ form }: { form: Form }) {
  const { isSubmitting, isSubmitSuccessful } = useFormState({ control: form.control });
  const { errors } = useFormState({ control: form.control });
  const isLeaving = isSubmitSuccessful && Object.keys(errors).length === 0;
  return (
    <Button tone="primary" type="submit" pending={isSubmitting || isLeaving} pendingLabel="Logging…">
      Log the release
    </Button>
  );
}

function Beside({ form, level }: { form: Form; level: number }) {
  const fieldEndOn = useWatch({ control: form.control, name: 'fieldEndOn' });
  return (
    <aside
      aria-label="Findings so far"
      tabIndex={0}
      className="min-w-0 border-t-2 border-ink pt-4 lg:sticky lg:top-6 lg:max-h-[calc(100dvh-3rem)] lg:self-start lg:overflow-y-auto lg:border-t-0 lg:pt-0 lg:pl-1"
    >
      <LivePanel level={level} fieldEndOn={fieldEndOn} />
    </aside>
  );
}
