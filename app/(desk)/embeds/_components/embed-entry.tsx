import Link from 'next/link';
import { embargoEnd } from '@/components/lines/embargo-band';
import { when } from '@/components/lines/when';
import { CautionNote } from '@/components/ui/caution-note';
import { Details } from '@/components/ui/details';
import { formatInstant } from '@/lib/format/date';
import type { EmbedItem } from '@/lib/services/embed/list-embeds';
import { CopyCode } from './copy-code';
import { EMBED_HEIGHT_PX, embedCode } from './embed-code';

const STATES: Record<EmbedItem['state'], string> = { live: 'Live', waiting: 'Waiting', pulled: 'Pulled' };

/** One embed: where it stands, its address, the code for an article. */
export function EmbedEntry({
  embed,
  opensSheets,
  now,
  zone,
}: {
  embed: EmbedItem;
  opensSheets: boolean;
  now: number;
  zone: string;
}) {
  const { id, url, chartTitle, state } = embed;
  const isShown = state === 'live' && embed.hold === null;
  const title = chartTitle === '' ? 'A chart without title' : chartTitle;
  return (
    <article
      id={`embed-${id}`}
      aria-labelledby={`title-${id}`}
      className="mb-8 scroll-mt-6 border-t-[1.5px] border-ink pt-3 target:bg-panel"
    >
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <h2
          id={`title-${id}`}
          className={`max-w-prose font-serif text-24 ${state === 'pulled' ? 'text-soft line-through' : ''}`}
        >
          {title}
        </h2>
        <p className={isShown ? 'font-semibold' : 'font-semibold text-caution'}>
          {isShown || state !== 'live' ? STATES[state] : 'Held'}
        </p>
      </div>
      <p className="text-soft">
        {embed.race}, {embed.pollster}. Version {embed.version}, made by {embed.createdBy},{' '}
        {when(embed.createdAt, now, zone)}.
        {opensSheets ? (
          <>
            {' '}
            <Link href={`/lines/${embed.sheetId}`}>
              The sheet<span className="sr-only"> of {title}</span>
            </Link>
          </>
        ) : null}
      </p>
      <p className="mt-1 max-w-prose">{standing(embed, zone)}</p>
      {embed.oneReader && state !== 'pulled' ? (
        <CautionNote title="One reader">
          <p>{embed.oneReader} released these words alone at night. A second person has not read them yet.</p>
        </CautionNote>
      ) : null}
      <p className="mt-1 wrap-anywhere">
        Address:{' '}
        {state === 'live' ? (
          <a href={url} className="link-as-address">
            {url}
          </a>
        ) : (
          <code>{url}</code>
        )}
      </p>
      {state === 'pulled' ? null : <CopyCode id={id} code={embedCode(embed)} />}
      {state === 'live' ? (
        <Details summary="Preview">
          <iframe
            src={`/embed/${id}`}
            title={`Preview: ${title}`}
            loading="lazy"
            className="w-full max-w-[680px] border border-rule"
            height={EMBED_HEIGHT_PX}
          />
        </Details>
      ) : null}
    </article>
  );
}

function standing({ state, embargoAt, pulledAt, hold }: EmbedItem, zone: string): string {
  if (state === 'live' && hold) return heldWords(hold, zone);
  if (state === 'live') return 'Public now. Articles show the newest cleared version.';
  if (state === 'waiting') {
    const until = embargoAt === null ? '' : ` (${embargoEnd({ at: embargoAt, zone })})`;
    return `The address exists; it answers 404 until the embargo ends${until}.`;
  }
  const at = pulledAt === null ? '' : ` on ${formatInstant(pulledAt, zone, 'en-GB')}`;
  return `Pulled${at}. Where readers saw it, a note without figures says that the chart was withdrawn.`;
}

function heldWords(hold: NonNullable<EmbedItem['hold']>, zone: string): string {
  const until = formatInstant(hold.untilAt, zone, 'en-GB');
  switch (hold.kind) {
    case 'embargo':
      return `The address answers 404 until the embargo ends (${until}).`;
    case 'taken-down':
      return `Barred by a publication ban until ${until}: articles show a note without figures meanwhile.`;
    case 'frozen':
      return `New figures are barred by a publication ban until ${until}: articles show version ${hold.version}, which was public before.`;
    case 'not-shown':
      return `New figures are barred by a publication ban until ${until}: the address answers 404 meanwhile.`;
  }
}
