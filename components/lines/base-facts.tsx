import type { ReleaseFacts } from '@/lib/domain/release-facts';
import { DESIGN_NAMES, MODE_NAMES, POPULATION_NAMES, SAMPLE_SOURCE_NAMES } from '@/lib/domain/vocabulary';
import type { BaseAnswer } from '@/lib/findings/check-types';
import { formatDay, formatDayRange } from '@/lib/format/date';
import { formatCount, formatTrimmed } from '@/lib/format/number';
import { baseSummary, noteText } from '@/lib/wording/base-words';
import { DefinitionList } from '../ui/definition-list';
import { Details } from '../ui/details';
import { SectionHeading } from '../ui/section-heading';
import { said } from './said';

const LOCALE = 'en-GB';

/** Who was asked, how many, when and how. */
export function BaseFacts({ release, base }: { release: ReleaseFacts; base: BaseAnswer }) {
  return (
    <section aria-labelledby="evidence-base" className="base-facts">
      <SectionHeading id="evidence-base" level={3}>
        Base
      </SectionHeading>
      <DefinitionList items={itemsOf(release)} className="particulars" />
      <Details summary="How it was counted">
        <p className="max-w-prose text-13 text-soft">{baseSummary(base)}</p>
        {base.notes.map((note) => (
          <p key={note} className="mt-1 max-w-prose text-13 text-soft">
            {noteText(note)}
          </p>
        ))}
      </Details>
    </section>
  );
}

function itemsOf(release: ReleaseFacts) {
  const { fieldStartOn, fieldEndOn, publishedOn } = release;
  return [
    { term: 'Pollster', value: release.pollster.name },
    { term: 'Sponsor', value: said(release.sponsor, ({ name }) => name) },
    { term: 'Interviews', value: said(release.n, (n) => formatCount(n, LOCALE)) },
    { term: 'Population', value: said(release.population, (one) => POPULATION_NAMES[one]) },
    { term: 'Field dates', value: formatDayRange(fieldStartOn, fieldEndOn, LOCALE, { withYear: true }) },
    { term: 'Published', value: formatDay(publishedOn, LOCALE) },
    { term: 'Sample', value: SAMPLE_SOURCE_NAMES[release.sampleSource] },
    { term: 'Mode', value: said(release.mode, (mode) => MODE_NAMES[mode]) },
    { term: 'Design', value: DESIGN_NAMES[release.design] },
    {
      term: 'Stated margin',
      value: said(release.statedMargin, ({ pp }) => `± ${formatTrimmed(pp, 2, LOCALE)}`),
    },
    { term: 'Question', value: said(release.questionWording, (wording) => `“${wording}”`) },
  ];
}
