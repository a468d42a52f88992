'use client';

import { useState } from 'react';
import { Button } from '../../ui/button';
import { CautionNote } from '../../ui/caution-note';
import { ErrorSummary, type FieldFault } from '../../ui/error-summary';
import { NextBar } from '../../ui/next-bar';
import { TextArea } from '../../ui/text-area';
import { decisionName } from './decision-words';
import { fieldId } from './setting-field';
import { type Sentence, SentencesForm } from './sentences-form';
import { type PropsOf, SettingsForm } from './settings-form';
import type { Slot } from './sentence-field';
import { type Faults, type SaveStatus, useStyleDraft } from './use-style-draft';

/** What proposing is answered with; `fields` by path. */
type Answer = { ok: true } | { ok: false; message: string; fields: Readonly<Record<string, string>> };

export type EditorDraft = {
  id: string;
  version: number;
  note: string;
  /** By path: decisions that are no sentences. */
  values: Record<string, unknown>;
  /** Typed and refused, by path. */
  typed: Record<string, unknown>;
  faults: Faults;
  sentences: Sentence[];
  slots: Record<string, Slot[]>;
  languages: string[];
};

/** A draft of house style being written. It saves itself; proposing it is the author's agreement. */
export function StyleEditor({
  draft,
  propose,
  onProposed,
}: {
  draft: EditorDraft;
  propose: (input: unknown) => Promise<Answer>;
  onProposed: () => void;
}) {
  const { faults, status, savedAt, decide, settle } = useStyleDraft(draft.id, draft);
  const [values, setValues] = useState<Record<string, unknown>>({ ...draft.values, ...draft.typed });
  const [note, setNote] = useState(draft.note);
  const [isPending, setPending] = useState(false);
  const [refused, setRefused] = useState<FieldFault[]>([]);
  const [attempt, setAttempt] = useState(0);

  const change = (path: string, value: unknown) => {
    setValues((before) => ({ ...before, [path]: value }));
    decide(path, value);
  };
  const propsOf: PropsOf = (path) => ({
    path,
    value: values[path],
    faults: faults[path] ?? [],
    onChange: (value) => change(path, value),
  });

  const submit = async () => {
    setPending(true);
    const version = await settle();
    const result = await propose({ id: draft.id, version, note }).catch(() => null);
    setPending(false);
    setAttempt((count) => count + 1);
    if (result?.ok) return onProposed();
    setRefused(result ? faultList(result) : [{ message: 'Leadline did not answer. Try again.' }]);
  };

  return (
    <form method="post" noValidate onSubmit={(event) => event.preventDefault()}>
      <ErrorSummary faults={refused} attempt={attempt} title="This version cannot be proposed yet" />
      {status.kind === 'conflict' ? (
        <CautionNote title="This draft was changed in another window.">
          <p>What you typed since stays on this page and is not saved. Reload to go on from the other one.</p>
        </CautionNote>
      ) : null}
      <SettingsForm propsOf={propsOf} languages={draft.languages} />
      <SentencesForm
        draftId={draft.id}
        sentences={draft.sentences}
        slots={draft.slots}
        values={values}
        faults={faults}
        savedAt={savedAt}
        onChange={change}
      />
      <TextArea
        id="style-note"
        label="Note for the second editor"
        hint="What changes, and why. It is kept with the version."
        value={note}
        maxLength={2000}
        onChange={(event) => setNote(event.target.value)}
        fieldClassName="mt-6 max-w-prose"
      />
      <NextBar
        actions={
          <Button tone="primary" pending={isPending} onClick={() => void submit()}>
            Propose this version
          </Button>
        }
      >
        <p role="status">{statusWords(status)}</p>
        <p className="text-soft">Proposing is your agreement. Another editor puts it in force.</p>
      </NextBar>
    </form>
  );
}

function faultList(failure: Answer): FieldFault[] {
  if (failure.ok) return [];
  const entries = Object.entries(failure.fields);
  if (entries.length === 0) return [{ message: failure.message }];
  return entries.map(([path, message]) =>
    path === 'note'
      ? { message, fieldId: 'style-note' }
      : {
          message: `${decisionName(path)}: ${message}`,
          fieldId: path.startsWith('style.messages.')
            ? `sentence-${path.replace(/\./g, '-')}`
            : fieldId(path),
        },
  );
}

function statusWords(status: SaveStatus): string {
  switch (status.kind) {
    case 'idle':
      return 'This draft saves itself while you type.';
    case 'saving':
      return 'Saving…';
    case 'saved':
      return 'Saved.';
    case 'failed':
      return `Not saved yet: ${status.message}`;
    case 'conflict':
      return 'Not saved: this draft was changed in another window.';
  }
}
