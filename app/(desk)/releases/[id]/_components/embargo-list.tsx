'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { CopyStatus } from '@/components/ui/copy-status';
import { SectionHeading } from '@/components/ui/section-heading';
import { Select } from '@/components/ui/select';
import type { ActionResult } from '@/lib/errors';
import { useAction } from '../../../../_components/use-action';

type Reader = { personId: string | null; name: string | null };
type SetReader = (input: unknown) => Promise<ActionResult<void>>;

const COPY_DESK = 'copy-desk';
const DESK_NAME = 'The whole copy desk';

/** Who may read this release before its hour, so that pages can be made up; every view is recorded. */
export function EmbargoList({
  id,
  readers,
  candidates,
  setReader,
}: {
  id: string;
  readers: readonly Reader[];
  candidates: readonly { id: string; name: string }[];
  setReader: SetReader;
}) {
  const router = useRouter();
  const { run, isPending, failure } = useAction(setReader);
  const listed = new Set(readers.map((reader) => reader.personId));
  const open = [
    ...(listed.has(null) ? [] : [{ value: COPY_DESK, label: DESK_NAME }]),
    ...candidates.filter((one) => !listed.has(one.id)).map((one) => ({ value: one.id, label: one.name })),
  ];

  const change = async (personId: string | null, isListed: boolean) => {
    const result = await run({ id, personId, listed: isListed });
    if (result.ok) router.refresh();
  };
  const add = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const chosen = String(new FormData(event.currentTarget).get('reader') ?? '');
    if (chosen !== '') void change(chosen === COPY_DESK ? null : chosen, true);
  };

  return (
    <section aria-labelledby="embargo-list" className="mb-6">
      <SectionHeading id="embargo-list">Embargo list</SectionHeading>
      {readers.length === 0 ? (
        <p className="mb-2">Nobody beside reporters and editors reads this yet.</p>
      ) : (
        <ul className="mb-2">
          {readers.map(({ personId, name }) => (
            <li key={personId ?? COPY_DESK} className="flex items-center justify-between gap-3 py-1">
              {name ?? DESK_NAME}
              <Button pending={isPending} onClick={() => void change(personId, false)}>
                Take off<span className="sr-only"> {name ?? DESK_NAME}</span>
              </Button>
            </li>
          ))}
        </ul>
      )}
      {open.length > 0 ? (
        <form method="post" noValidate onSubmit={add} className="flex flex-wrap items-end gap-3">
          <Select
            id="embargo-reader"
            name="reader"
            label="Open it to"
            empty="Choose"
            choices={open}
            fieldClassName="mb-0! min-w-40 flex-1"
          />
          <Button type="submit" pending={isPending}>
            Put on the list
          </Button>
        </form>
      ) : null}
      <CopyStatus message={failure?.message ?? null} isFault />
    </section>
  );
}
