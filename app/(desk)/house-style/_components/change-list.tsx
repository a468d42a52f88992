import { decisionName, valueWords } from '@/components/forms/house-style/decision-words';
import { diffParts } from '@/components/lines/diff-parts';
import { WordDiff } from '@/components/ui/word-diff';

export type ListedChange = { path: string; before?: unknown; after?: unknown };

/** What differs between two versions, decision by decision, word by word. */
export function ChangeList({ changes }: { changes: readonly ListedChange[] }) {
  if (changes.length === 0) return <p className="text-soft">Nothing differs.</p>;
  return (
    <dl>
      {changes.map(({ path, before, after }) => (
        <div key={path} className="border-b border-rule py-3">
          <dt className="text-13 text-soft">{decisionName(path)}</dt>
          <dd
            className={
              path.startsWith('style.messages.') ? 'max-w-prose font-serif wrap-anywhere' : 'max-w-prose'
            }
          >
            <WordDiff parts={diffParts(valueWords(path, before), valueWords(path, after))} />
          </dd>
        </div>
      ))}
    </dl>
  );
}
