'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useCallback, useEffect, useRef, useState } from 'react';
import { type Consequence, CORRECTION_SOURCE_NAMES, CORRECTION_SOURCES } from '@/lib/domain/corrections';
import { CORRECTED_ITEM_NAMES, type CorrectedItem } from '@/lib/findings/what-changed';
import { ConsequenceList, consequenceSummary } from '../../corrections/consequence-list';
import { Button } from '../../ui/button';
import { CautionNote } from '../../ui/caution-note';
import { Radios } from '../../ui/radios';
import { SectionHeading } from '../../ui/section-heading';
import { TextArea } from '../../ui/text-area';
import type { FormChoices } from './form-choices';
import type { ReleaseForm } from './form-values';
import { type Answer, type Refusal, ReleaseFields } from './release-fields';
import { useLeaveWarning } from './use-leave-warning';
import { useReleaseForm } from './use-release-form';

export type Previewed = { changed: CorrectedItem[]; consequences: Consequence[]; hash: string };
type Asked = { id: string; version: number; release: ReleaseForm };

const UNSENT: Refusal = {
  ok: false,
  code: 'unreachable',
  message:
    'Leadline cannot be reached, or was renewed meanwhile. What you typed is still on this page; try again.',
  fields: {},
};

/** Corrected figures, what they do to everything in print, and only then the decision. */
export function CorrectForm({
  choices,
  personId,
  stored,
  preview,
  correct,
}: {
  choices: FormChoices;
  personId: string;
  stored: { id: string; version: number; values: ReleaseForm };
  preview: (input: unknown) => Promise<Answer<Previewed>>;
  correct: (input: unknown) => Promise<Answer<{ id: string }>>;
}) {
  const form = useReleaseForm(stored.values, choices.policy);
  const { getValues } = form;
  useLeaveWarning(
    useCallback(() => getValues(), [getValues]),
    stored.values,
  );
  const [seen, setSeen] = useState<(Previewed & { asked: Asked }) | null>(null);

  async function look(release: ReleaseForm): Promise<Answer<null>> {
    const asked = { id: stored.id, version: stored.version, release };
    const answer = await preview(asked).catch(() => UNSENT);
    if (!answer.ok) return answer;
    setSeen({ ...answer.value, asked });
    return { ok: true, value: null };
  }

  return (
    <>
      {seen ? <Decide seen={seen} correct={correct} back={() => setSeen(null)} /> : null}
      <div hidden={seen !== null}>
        <ReleaseFields
          form={form}
          choices={choices}
          personId={personId}
          releaseId={stored.id}
          lead={null}
          send={{ label: 'See what this does', pendingLabel: 'Looking…' }}
          submit={look}
        />
      </div>
    </>
  );
}

function Decide({
  seen,
  correct,
  back,
}: {
  seen: Previewed & { asked: Asked };
  correct: (input: unknown) => Promise<Answer<{ id: string }>>;
  back: () => void;
}) {
  const router = useRouter();
  const heading = useRef<HTMLDivElement>(null);
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const [isPending, setPending] = useState(false);
  useEffect(() => heading.current?.focus(), []);

  const decide = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const given = new FormData(event.currentTarget);
    const word = (name: string) => {
      const value = given.get(name);
      return typeof value === 'string' ? value : '';
    };
    const submitter = (event.nativeEvent as SubmitEvent).submitter;
    const how = submitter instanceof HTMLButtonElement && submitter.value === 'staged' ? 'staged' : 'now';
    setPending(true);
    const told = { whose: word('whose'), explanation: word('explanation'), how, seen: seen.hash };
    const answer = await correct({ ...seen.asked, ...told }).catch(() => UNSENT);
    setPending(false);
    if (answer.ok) router.push(`/releases/corrections/${answer.value.id}`);
    else setRefusal(answer);
  };

  return (
    <form method="post" noValidate onSubmit={decide} className="max-w-form" aria-label="Correction">
      <div ref={heading} tabIndex={-1}>
        <SectionHeading>What this correction does</SectionHeading>
      </div>
      <p className="my-3 max-w-prose">
        <strong>{consequenceSummary(seen.consequences)}</strong> What differs:{' '}
        {seen.changed.map((item) => CORRECTED_ITEM_NAMES[item].toLowerCase()).join(', ')}.
      </p>
      {refusal ? (
        <CautionNote title="Nothing was done">
          <p role="alert">{refusal.message}</p>
        </CautionNote>
      ) : null}
      <ConsequenceList consequences={seen.consequences} />
      <div className="mt-6">
        <Radios
          id="whose"
          name="whose"
          label="Whose correction is it?"
          choices={CORRECTION_SOURCES.map((value) => ({ value, label: CORRECTION_SOURCE_NAMES[value] }))}
          error={refusal?.fields.whose}
        />
        <TextArea
          id="explanation"
          name="explanation"
          label="What was wrong, in a sentence"
          hint="For the history and for staff. The public note at a chart says whose correction it was, and no figure."
          maxLength={2000}
          required
          error={refusal?.fields.explanation}
        />
        <div className="flex flex-wrap gap-3">
          <Button onClick={back}>Back to the figures</Button>
          <Button
            type="submit"
            name="how"
            value="now"
            tone="primary"
            pending={isPending}
            pendingLabel="Correcting…"
          >
            Apply now
          </Button>
          {seen.consequences.length > 0 ? (
            <Button type="submit" name="how" value="staged" pending={isPending} pendingLabel="Staging…">
              Stage it, and clear new words first
            </Button>
          ) : null}
        </div>
        <p className="mt-3 max-w-prose text-13 text-soft">
          Applying pulls at once what differs. A staged correction leaves everything in print as it is until
          new words are agreed to; then old and new change places in one moment.
        </p>
      </div>
    </form>
  );
}
