'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, type ReactNode, useState } from 'react';
import { type FieldPath, useFormState, useWatch } from 'react-hook-form';
import { Button } from '../../ui/button';
import { ErrorSummary } from '../../ui/error-summary';
import { DatesGroup, EmbargoFields } from './dates-group';
import { faultsOf } from './field-path';
import type { Form } from './fields';
import type { FormChoices } from './form-choices';
import { pruned, type ReleaseForm } from './form-values';
import { LiveProvider } from './live';
import { LivePanel } from './live-panel';
import { QuestionGroup, SourceGroup } from './question-groups';
import { FixedRace, RaceGroup } from './race-group';
import { PollsterGroup, SampleGroup, SizeGroup } from './sample-groups';
import { SharesGrid } from './shares-grid';

export type Refusal = { ok: false; code: string; message: string; fields: Record<string, string> };
export type Answer<Value> = { ok: true; value: Value } | Refusal;

/** The form itself, findings beside it on wide screens and beneath it on narrow ones. */
export function ReleaseFields({
  form,
  choices,
  personId,
  releaseId = '',
  lead,
  send,
  submit,
}: {
  form: Form;
  choices: FormChoices;
  personId: string;
  /** Of a release on file, whose race and embargo stay as they are. */
  releaseId?: string;
  /** Above the fields. */
  lead: ReactNode;
  send: { label: string; pendingLabel: string };
  /** Sends what was validated; the id of the release comes back, or null where the page goes on by itself. */
  submit: (values: ReleaseForm) => Promise<Answer<{ id: string } | null>>;
}) {
  const [attempt, setAttempt] = useState(0);
  const router = useRouter();
  const isOnFile = releaseId !== '';

  async function deliver(values: ReleaseForm) {
    const answer = await submit(values);
    if (answer.ok && answer.value) return router.push(`/releases/${answer.value.id}`);
    if (answer.ok) return form.reset(undefined, { keepValues: true, keepDefaultValues: true });
    showRefusal(form, answer);
    setAttempt((count) => count + 1);
  }

  function onSubmit(event: FormEvent) {
    const values = pruned(form.getValues());
    form.setValue('shares', values.shares);
    form.setValue('race', values.race);
    form.setValue('modelledInterval', values.modelledInterval);
    void form.handleSubmit(deliver, () => setAttempt((count) => count + 1))(event);
  }

  return (
    <LiveProvider control={form.control} choices={choices} personId={personId} releaseId={releaseId}>
      <div className="grid gap-x-10 lg:grid-cols-[minmax(0,1fr)_minmax(0,26rem)] xl:grid-cols-[minmax(0,1fr)_minmax(0,30rem)]">
        <form noValidate onSubmit={onSubmit} aria-label="Release" className="min-w-0 max-w-form">
          {lead}
          <Faults form={form} attempt={attempt} />
          {isOnFile ? (
            <FixedRace form={form} races={choices.races} />
          ) : (
            <RaceGroup form={form} races={choices.races} />
          )}
          <PollsterGroup form={form} pollsters={choices.pollsters} sponsors={choices.sponsors} />
          <SampleGroup form={form} />
          <DatesGroup form={form}>
            {isOnFile ? (
              <p className="text-13 text-soft">
                An embargo stays as it is: it is changed on the release page.
              </p>
            ) : (
              <EmbargoFields form={form} zone={choices.zone} />
            )}
          </DatesGroup>
          <SizeGroup form={form} />
          <QuestionGroup form={form} />
          <SharesGrid form={form} />
          <SourceGroup form={form} />
          <Send form={form} {...send} />
        </form>
        <Beside form={form} level={choices.policy.level} />
      </div>
    </LiveProvider>
  );
}

/** A refusal of the service, at its fields; the whole form's is told on top. */
function showRefusal(form: Form, { message, fields }: Refusal) {
  const faults = Object.entries(fields).map(([path, text]) => [path.replace(/^release\./, ''), text]);
  for (const [path, text] of faults)
    form.setError(path ? (path as FieldPath<ReleaseForm>) : 'root.server', { type: 'server', message: text });
  if (faults.length === 0) form.setError('root.server', { type: 'server', message });
}

function Faults({ form, attempt }: { form: Form; attempt: number }) {
  const { errors } = useFormState({ control: form.control });
  return <ErrorSummary faults={attempt === 0 ? [] : faultsOf(errors)} attempt={attempt} />;
}

function Send({ form, label, pendingLabel }: { form: Form; label: string; pendingLabel: string }) {
  const { isSubmitting, isSubmitSuccessful, errors } = useFormState({ control: form.control });
  const isLeaving = isSubmitSuccessful && Object.keys(errors).length === 0;
  return (
    <Button tone="primary" type="submit" pending={isSubmitting || isLeaving} pendingLabel={pendingLabel}>
      {label}
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
