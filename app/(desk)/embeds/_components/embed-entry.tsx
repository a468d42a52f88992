import Link from 'next/link';
import { when } from '@/components/lines/when';
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
        <p className={state === 'live' ? 'font-semibold' : 'font-semibold text-caution'}>{STATES[state]}</p>
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

function standing({ state, embargoAt, pulledAt }: EmbedItem, zone: string): string {
  if (state === 'live') return 'Public now. Articles show the newest cleared version.';
  if (state === 'waiting') {
    const until = embargoAt === null ? '' : ` (${formatInstant(embargoAt, zone, 'en-GB')})`;
    return `The address exists; it answers 404 until the embargo ends${until}.`;
  }
  const at = pulledAt === null ? '' : ` on ${formatInstant(pulledAt, zone, 'en-GB')}`;
  return `Pulled${at}. Where readers saw it, a note without figures says that the chart was withdrawn.`;
}
