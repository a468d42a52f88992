import Link from 'next/link';
import { embargoEnd } from '@/components/lines/embargo-band';
import { DefinitionList } from '@/components/ui/definition-list';
import { dayInZone } from '@/lib/domain/wall-clock';
import { formatDay } from '@/lib/format/date';
import { LANGUAGE_NAMES, LANGUAGES } from '@/lib/domain/vocabulary';
import type { HeldEmbed } from '@/lib/services/embed/embed-hold';
import type { DeskView } from '@/lib/services/sheet/desk-view';

/** What bars these figures or will, and the embeds of the same claim that are held for it. */
export function StandingPlaces({ desk }: { desk: DeskView }) {
  return (
    <DefinitionList
      className="particulars"
      items={[
        { term: 'Bans', value: <Bans desk={desk} /> },
        { term: 'Embeds held', value: <Embeds held={desk.heldEmbeds} /> },
        { term: 'Language', value: <Languages desk={desk} /> },
      ]}
    />
  );
}

/** Its own language, where the same claim stands in another, and in which it can still be drafted. */
function Languages({ desk: { siblings, claim, language: own } }: { desk: DeskView }) {
  const missing = LANGUAGES.filter(
    (one) => one !== own && !siblings.some(({ language }) => language === one),
  );
  const draft = (language: string) =>
    `/lines/new?${new URLSearchParams({ release: claim.releaseId, claim: claim.key, language })}`;
  return (
    <>
      {languageName(own)}
      {siblings.map(({ id, language }) => (
        <span key={id}>
          , <Link href={`/lines/${id}`}>{languageName(language)}</Link>
        </span>
      ))}
      {missing.length > 0 ? '; draft ' : null}
      {missing.map((language, at) => (
        <span key={language}>
          {at > 0 ? ', ' : ''}
          <Link href={draft(language)} title={`Draft it in ${languageName(language)}`}>
            {language}
            <span className="sr-only"> ({languageName(language)})</span>
          </Link>
        </span>
      ))}
    </>
  );
}

function Bans({ desk: { holds, bansAhead } }: { desk: DeskView }) {
  if (holds.length + bansAhead.length === 0) return <span className="text-soft">none in force or ahead</span>;
  return (
    <ul>
      {holds.map(({ jurisdiction, untilAt, zone }) => (
        <li key={`${jurisdiction} ${untilAt}`} className="font-semibold text-caution">
          {jurisdiction}, until {embargoEnd({ at: untilAt, zone })}
        </li>
      ))}
      {bansAhead.map(({ jurisdiction, fromAt, zone }) => (
        <li key={`${jurisdiction} ${fromAt}`}>
          {jurisdiction}, from {formatDay(dayInZone(fromAt, zone), 'en-GB')}
        </li>
      ))}
    </ul>
  );
}

function Embeds({ held }: { held: readonly HeldEmbed[] }) {
  if (held.length === 0) return <span className="text-soft">none</span>;
  return (
    <ul>
      {held.map(({ id, language, hold }) => (
        <li key={id}>
          <Link href={`/embeds#embed-${id}`}>{languageName(language)}</Link>: {HELD[hold.kind]}
        </li>
      ))}
    </ul>
  );
}

const HELD: Record<HeldEmbed['hold']['kind'], string> = {
  embargo: 'waits for the embargo',
  'taken-down': 'taken down by a ban',
  frozen: 'frozen by a ban',
  'not-shown': 'not shown under a ban',
};

function languageName(language: string): string {
  return language in LANGUAGE_NAMES ? LANGUAGE_NAMES[language as keyof typeof LANGUAGE_NAMES] : language;
}
