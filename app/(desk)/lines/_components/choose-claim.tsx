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
import { LanguageChoice, type OfferedLanguage } from '@/components/lines/language-choice';
import type { Language } from '@/lib/domain/vocabulary';
import { isOfTwoReleases } from '@/lib/wording/draft-input';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { ActionResult } from '@/lib/errors';
import type { CheckAnswer, CheckDocument, TestableFinding } from '@/lib/findings/check-types';
import { claimKey } from '@/lib/findings/claim-key';
import { headingOf } from '@/lib/findings/heading';
import { faultsOf, useAction } from '../../../_components/use-action';

type Input = { submissionKey: string; releaseId: string; claimKey: string; language: Language };

const ONE_POLL = {
  allow: '',
  warn: 'This claim rests on one poll. House style asks for such headlines to be put in their trend.',
  refuse: 'This claim rests on one poll. House style files no headline on one: it is drafted knocked out.',
};

/** What the sheet claims: one of the findings of the release, with what each supports in sight. */
export function ChooseClaim({
  releaseId,
  preselected,
  preselectedLanguage,
  languages,
  onePollHeadlines,
  facts,
  previous,
  document,
  answer,
  create,
}: {
  releaseId: string;
  preselected: string | null;
  preselectedLanguage: Language;
  languages: readonly OfferedLanguage[];
  /** What house style makes of a headline that rests on one poll. */
  onePollHeadlines: 'allow' | 'warn' | 'refuse';
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
  const [language, setLanguage] = useState(preselectedLanguage);
  const [submissionKey] = useState(newSubmissionKey);
  const [isMade, setMade] = useState(false);
  const { run, isPending, failure, attempt } = useAction(create);
  const between = previous ? betweenReleases(previous.fieldStartOn, facts.fieldStartOn) : undefined;

  const picked = findings.find((finding) => claimKey(finding) === chosen);
  const onePoll = picked !== undefined && !isOfTwoReleases(picked.kind);

  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (isPending || isMade) return;
    const result = await run({ submissionKey, releaseId, claimKey: chosen, language });
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
      <p role="status" className="mb-4 max-w-prose text-soft">
        {onePoll ? ONE_POLL[onePollHeadlines] : ''}
      </p>
      <LanguageChoice id="language" languages={languages} value={language} onChange={setLanguage} />
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
