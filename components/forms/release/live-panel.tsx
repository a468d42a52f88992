'use client';

import { memo } from 'react';
import { betweenReleases } from '../../findings/between';
import { ComparedWith } from '../../findings/compared-with';
import { testedFindings } from '../../findings/finding-list';
import { verdictSummary } from '../../findings/verdict-summary';
import { SectionHeading } from '../../ui/section-heading';
import { formatLevel, ENGLISH_CHART_WORDS } from '@/lib/charts/chart-words';
import { baseSummary, noteText } from '@/lib/wording/base-words';
import { useLive } from './live';
import { LiveCards } from './live-cards';
import type { LiveFindings } from './live-findings';
import type { ComparisonState } from './use-comparison';

/** What the numbers typed so far support, computed in this browser. */
export function LivePanel({ level, fieldEndOn }: { level: number; fieldEndOn: string }) {
  const { findings, comparison, isNewRace } = useLive();
  const previous = comparison.kind === 'answered' ? comparison.compared.previous : null;
  const between = previous ? betweenReleases(previous.fieldEndOn, fieldEndOn) : undefined;
  return (
    <section aria-labelledby="live-heading">
      <SectionHeading id="live-heading">
        What the numbers support, at {formatLevel(level, ENGLISH_CHART_WORDS)}
      </SectionHeading>
      <p role="status" className="mb-4 text-15 font-semibold">
        {summaryOf(findings)}
      </p>
      <LiveList findings={findings} between={between} />
      <SectionHeading level={3}>Compared with</SectionHeading>
      <LiveComparison comparison={comparison} isNewRace={isNewRace} />
    </section>
  );
}

function summaryOf(findings: LiveFindings): string {
  switch (findings.kind) {
    case 'nothing':
      return 'Type the shares, and what they support appears here.';
    case 'refused':
      return `These figures cannot be: ${findings.message}`;
    case 'answer':
      return verdictSummary(testedFindings(findings.answer).map((finding) => finding.verdict));
  }
}

const LiveList = memo(function LiveList({ findings, between }: { findings: LiveFindings; between?: string }) {
  if (findings.kind === 'nothing') return null;
  const notes = findings.kind === 'answer' ? findings.answer.base.notes.map(noteText) : [];
  return (
    <>
      {findings.kind === 'answer' ? <LiveCards findings={findings} between={between} /> : null}
      {findings.kind === 'answer' ? (
        <p className="mb-3 max-w-prose text-13 text-soft">{baseSummary(findings.answer.base)}</p>
      ) : null}
      <ul className="mb-5 max-w-prose text-13 text-soft">
        {[...notes, ...findings.leftOut].map((note) => (
          <li key={note} className="py-0.5">
            {note}
          </li>
        ))}
      </ul>
    </>
  );
});

function LiveComparison({ comparison, isNewRace }: { comparison: ComparisonState; isNewRace: boolean }) {
  switch (comparison.kind) {
    case 'not-asked':
      return (
        <p className="max-w-prose text-soft">
          {isNewRace
            ? 'A race that is new has nothing to compare with yet.'
            : 'Once race and pollster are named, their latest comparable release is looked up.'}
        </p>
      );
    case 'asking':
      return <p className="text-soft">Looking for earlier releases…</p>;
    case 'failed':
      return (
        <p className="max-w-prose text-soft">
          Earlier releases could not be looked up: {comparison.message} The change is computed again once the
          release is logged.
        </p>
      );
    case 'answered': {
      const { previous, comparison: told } = comparison.compared;
      if (!told) return <p className="text-soft">Nothing by this pollster is on file for this race.</p>;
      return <ComparedWith previous={previous} told={{ ...told, override: null }} />;
    }
  }
}
