import { Fold } from './fold';
import { isTakenBack } from './taken-back';
import { when } from './when';

export type Act = { act: string; person: string; at: number; comment: string | null };

const WORDS: Record<string, string> = {
  filed: 'filed it',
  cleared: 'cleared it',
  'sent-back': 'sent it back',
  returned: 'would have cleared it, but the evidence had changed',
  pulled: 'pulled it',
};

/** Everything done to a sheet, oldest first. */
export function ActsList({
  acts,
  isUnfolded = true,
  now,
  zone,
}: {
  acts: readonly Act[];
  isUnfolded?: boolean;
  now: number;
  zone: string;
}) {
  if (acts.length === 0) return null;
  return (
    <Fold id="acts" title="What was done" isOpen={isUnfolded}>
      <ol>
        {acts.map(({ act, person, at, comment }, index) => {
          const isOwn = isTakenBack(acts, index);
          return (
            <li key={index} className="border-b border-rule py-2">
              <strong className="font-semibold">{person}</strong>{' '}
              {isOwn ? 'took it back' : (WORDS[act] ?? act)},{' '}
              <time dateTime={new Date(at).toISOString()}>{when(at, now, zone)}</time>
              {comment && !isOwn ? <p className="max-w-prose text-soft">“{comment}”</p> : null}
            </li>
          );
        })}
      </ol>
    </Fold>
  );
}
