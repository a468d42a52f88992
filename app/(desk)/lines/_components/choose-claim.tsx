'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { SoundingRow } from '@/components/charts/sounding';
import { VerdictMark } from '@/components/charts/verdict-mark';
import { betweenReleases } from '@/components/findings/between';
import { testedFindings } from '@/components/findings/finding-list';
import { newSubmissionKey } from '@/components/forms/release/submission-key';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorSummary } from '@/components/ui/error-summary';
import { Radios } from '@/components/ui/radios';
import { ENGLISH_CHART_WORDS } from '@/lib/charts/chart-words';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { ActionResult } from '@/lib/errors';
import type { CheckAnswer, CheckDocument, TestableFinding } from '@/lib/findings/check-types';
import { claimKey } from '@/lib/findings/claim-key';
import { headingOf } from '@/lib/findings/heading';
import { faultsOf, useAction } from '../../../_components/use-action';

type Input = { submissionKey: string; releaseId: string; claimKey: string };

/** What the sheet claims: one of the findings of the release, with what each supports in sight. */
export function ChooseClaim({
  releaseId,
  preselected,
  facts,
  previous,
  document,
  answer,
  create,
}: {
  releaseId: string;
  preselected: string | null;
  facts: ReleaseFacts;
  previous: ReleaseFacts | null;
  document: CheckDocument;
  answer: CheckAnswer;
  create: (input: Input) => Promise<ActionResult<{ id: string }>>;
}) {
  const router = useRouter();
  const findings = testedFindings(answer).filter(({ estimatePp }) => estimatePp !== null);
  const known = findings.some((finding) => claimKey(finding) === preselected);
  const [chosen, setChosen] = useState(known ? (preselected ?? '') : '');
  const [submissionKey] = useState(newSubmissionKey);
  const [isMade, setMade] = useState(false);
  const { run, isPending, failure, attempt } = useAction(create);
  const between = previous ? betweenReleases(previous.fieldStartOn, facts.fieldStartOn) : undefined;

  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (isPending || isMade) return;
    const result = await run({ submissionKey, releaseId, claimKey: chosen });
    if (!result.ok) return;
    setMade(true);
    router.push(`/lines/${result.value.id}`);
  };

  if (findings.length === 0)
    return (
      <EmptyState title="This release has no finding to write about">
        <p>A sheet needs two disclosed shares, a change, or a threshold of the race.</p>
      </EmptyState>
    );
  return (
    <form method="post" noValidate onSubmit={submit} className="mt-6 max-w-form">
      <ErrorSummary
        faults={faultsOf(failure, { claimKey: 'claim' })}
        attempt={attempt}
        title="No sheet was drafted"
      />
      <Radios
        id="claim"
        name="claim"
        label="What does the sheet claim?"
        hint="The draft never says more than the verdict allows."
        value={chosen}
        onChange={(event) => setChosen(event.target.value)}
        error={failure?.fields.claimKey}
        choices={findings.map((finding) => ({
          value: claimKey(finding),
          label: <ClaimLabel finding={finding} document={document} between={between} />,
        }))}
      />
      <Button type="submit" tone="primary" pending={isPending || isMade} pendingLabel="Drafting…">
        Draft the sheet
      </Button>
    </form>
  );
}

function ClaimLabel({
  finding,
  document,
  between,
}: {
  finding: TestableFinding;
  document: CheckDocument;
  between: string | undefined;
}) {
  const spec = soundingSpecOf(finding, document, ENGLISH_CHART_WORDS);
  return (
    <span className="flex flex-wrap items-center gap-x-4 gap-y-1">
      <span className="font-semibold">{headingOf(finding, document, between)}</span>
      <VerdictMark verdict={finding.verdict} />
      {spec ? <SoundingRow spec={spec} /> : null}
    </span>
  );
}
