import { ENGLISH_CHART_WORDS, formatLevel } from '@/lib/charts/chart-words';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { ComparedWith } from '@/components/findings/compared-with';
import { CautionNote } from '@/components/ui/caution-note';
import { type Definition, DefinitionList } from '@/components/ui/definition-list';
import { SectionHeading } from '@/components/ui/section-heading';
import { valueOf } from '@/lib/domain/disclosed';
import { DESIGN_NAMES, SAMPLE_SOURCE_NAMES } from '@/lib/domain/vocabulary';
import { formatDay } from '@/lib/format/date';
import { formatCount, formatPoints, formatTrimmed } from '@/lib/format/number';
import type { ReleaseView } from '@/lib/services/release/get-release';
import { deffSourceText, noteText } from '@/lib/wording/base-words';

const LOCALE = 'en-GB';

/** What the findings stand on: the base, the release compared with, what is missing, where it was read. */
export function Particulars({ view, override }: { view: ReleaseView; override: ReactNode }) {
  const { facts, previous, comparison, answer, methodNoteHtml } = view;
  return (
    <>
      <Part title="Base">
        <DefinitionList items={baseItems(view)} />
        {answer.base.notes.map((note) => (
          <p key={note} className="mt-1 text-13 text-soft">
            {noteText(note)}
          </p>
        ))}
      </Part>
      <Part title="Compared with">
        <ComparedWith
          previous={previous}
          told={comparison}
          linkTo={({ releaseId }, name) => <Link href={`/releases/${releaseId}`}>{name}</Link>}
        />
        {override}
      </Part>
      <Missing view={view} />
      <Part title="Question">
        <p>{valueOf(facts.questionWording) ?? statusWords(facts.questionWording.status)}</p>
      </Part>
      <Part title="Source">
        <SourceLink view={view} />
      </Part>
      {methodNoteHtml ? (
        <Part title="Method note">
          {/* Rendered and sanitized on the server. */}
          <div
            className="prose-note max-w-prose [&_li]:ml-5 [&_ol]:list-decimal [&_p]:mb-2 [&_ul]:list-disc"
            dangerouslySetInnerHTML={{ __html: methodNoteHtml }}
          />
        </Part>
      ) : null}
    </>
  );
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mb-6">
      <SectionHeading>{title}</SectionHeading>
      {children}
    </section>
  );
}

function baseItems({ facts, answer }: ReleaseView): Definition[] {
  const { deff, deffSource, deffRange, nEff, maximumMarginPp } = answer.base;
  const n = valueOf(facts.n);
  const stated = valueOf(facts.statedMargin);
  const items: Definition[] = [
    { term: 'Interviews', value: n === null ? statusWords(facts.n.status) : formatCount(n, LOCALE) },
    { term: 'Sample', value: SAMPLE_SOURCE_NAMES[facts.sampleSource] },
    { term: 'Design', value: DESIGN_NAMES[facts.design] },
    { term: 'Published', value: formatDay(facts.publishedOn, LOCALE) },
  ];
  if (nEff !== null) items.push({ term: 'Worth, after weighting', value: formatCount(nEff, LOCALE) });
  if (deff !== null && deffSource && deffRange) {
    const [low, high] = deffRange.map((end) => formatTrimmed(end, 2, LOCALE));
    const range = low === high ? '' : ` (${low}–${high})`;
    items.push({ term: 'Design effect', value: `${formatTrimmed(deff, 2, LOCALE)}${range}` });
    items.push({ term: 'Where from', value: deffSourceText(deffSource) });
  }
  if (maximumMarginPp !== null)
    items.push({ term: 'Margin near 50%', value: `± ${formatPoints(maximumMarginPp, 1, LOCALE)}` });
  items.push({
    term: 'Stated margin',
    value: stated
      ? `± ${formatTrimmed(stated.pp, 2, LOCALE)} at ${formatLevel(stated.level, ENGLISH_CHART_WORDS)}`
      : statusWords(facts.statedMargin.status),
  });
  return items;
}

function Missing({ view: { missing } }: { view: ReleaseView }) {
  const withheld = missing.filter((item) => item.status === 'not-disclosed');
  const open = missing.filter((item) => item.status === 'not-entered');
  if (missing.length === 0) return null;
  return (
    <div className="mb-6">
      {withheld.length > 0 ? (
        <CautionNote title="Not disclosed by the pollster">
          <Items labels={withheld.map((item) => item.label)} />
        </CautionNote>
      ) : null}
      {open.length > 0 ? (
        <Part title="Not entered yet">
          <Items labels={open.map((item) => item.label)} />
        </Part>
      ) : null}
    </div>
  );
}

function Items({ labels }: { labels: readonly string[] }) {
  return (
    <ul>
      {labels.map((label) => (
        <li key={label}>{label}</li>
      ))}
    </ul>
  );
}

/** Only http and https become a link; the form and the service refuse everything else before. */
function SourceLink({ view: { facts } }: { view: ReleaseView }) {
  const url = valueOf(facts.sourceUrl);
  if (url === null || !/^https?:\/\//.test(url)) return <p>{statusWords(facts.sourceUrl.status)}</p>;
  return (
    <p>
      <a
        href={url}
        rel="noopener noreferrer nofollow"
        target="_blank"
        className="link-as-address [overflow-wrap:anywhere]"
      >
        {url}
        <span className="sr-only"> (opens another page)</span>
      </a>
    </p>
  );
}

function statusWords(status: string): string {
  return status === 'not-disclosed' ? 'Not disclosed' : 'Not entered';
}
