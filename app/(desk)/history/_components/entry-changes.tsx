import { Details } from '@/components/ui/details';
import { type Change, changesOf } from './changes-of';

type Entry = { before: unknown; after: unknown; reason: string | null; hidden: boolean };

/** What changed and why, one step away; or that an embargo still keeps it. */
export function EntryChanges({ entry }: { entry: Entry }) {
  if (entry.hidden) return <span className="text-soft italic">hidden until the embargo ends</span>;
  const changes = changesOf(entry.before, entry.after);
  return (
    <>
      {entry.reason ? <p>“{entry.reason}”</p> : null}
      {changes.length > 0 ? (
        <Details
          className="-mt-[5px]"
          summary={changes.length === 1 ? '1 value' : `${changes.length} values`}
        >
          <ChangeTable changes={changes} />
        </Details>
      ) : null}
    </>
  );
}

function ChangeTable({ changes }: { changes: readonly Change[] }) {
  return (
    <dl className="grid gap-2">
      {changes.map(({ what, before, after }) => (
        <div key={what}>
          <dt className="text-13 text-soft">{what}</dt>
          <dd className="max-w-prose">
            {before === null ? null : (
              <>
                <span className="sr-only">before: </span>
                <del className="text-soft">{before}</del>
                <span aria-hidden="true"> → </span>
              </>
            )}
            <span className="sr-only">{before === null ? '' : 'after: '}</span>
            {after ?? <span className="text-soft">left out</span>}
          </dd>
        </div>
      ))}
    </dl>
  );
}
