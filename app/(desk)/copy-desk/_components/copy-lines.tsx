'use client';

import { useState } from 'react';
import { fetchJson } from '@/components/forms/release/fetch-json';
import {
  type CopyForm,
  copyToClipboard,
  type Fetched,
  type Outcome,
} from '@/components/lines/copy-to-clipboard';
import { Button } from '@/components/ui/button';
import { CopyBlock } from '@/components/ui/copy-block';
import { CopyStatus } from '@/components/ui/copy-status';
import { formatTime } from '@/lib/format/date';
import { LINE_KIND_NAMES, type LineKind, type LineText } from '@/lib/domain/sheet';
import { ByHand } from './by-hand';

const FORMS: { form: CopyForm; word: string }[] = [
  { form: 'plain', word: 'Plain' },
  { form: 'rich', word: 'Rich' },
  { form: 'markdown', word: 'Markdown' },
];

const SMALL = '[&_.copy-block]:py-2 [&_.copy-block]:text-15';
const SIZES: Record<LineKind, string> = {
  headline: '',
  standfirst: '',
  body: '',
  'change-sentence': '',
  caveat: SMALL,
  'caveat-short': SMALL,
  'caveat-one-breath': SMALL,
  'method-note': SMALL,
  'chart-title': SMALL,
  'alt-text': SMALL,
  'spoken-line': '',
  'newsletter-line': '',
  'correction-notice': '',
};

type Status = { message: string; isFault: boolean };

/** The lines of a cleared sheet with their copy buttons. What is copied comes from the server, never from here. */
export function CopyLines({
  id,
  lines,
  blocked,
  zone,
}: {
  id: string;
  lines: readonly LineText[];
  /** Why nothing can be copied now. */
  blocked: string | null;
  zone: string;
}) {
  const [status, setStatus] = useState<Status | null>(null);
  const [byHand, setByHand] = useState<string | null>(null);
  const [running, setRunning] = useState<string | null>(null);

  const copy = async (key: string, kinds: LineKind[], form: CopyForm) => {
    if (running !== null) return;
    setRunning(key);
    setByHand(null);
    try {
      const outcome = await copyToClipboard(
        form,
        () =>
          fetchJson(`/api/desk/copy/${id}`, { method: 'POST', body: { kinds, form } }) as Promise<Fetched>,
      );
      if (outcome.kind === 'by-hand') setByHand(outcome.text);
      setStatus(statusOf(outcome, zone));
    } catch (error) {
      const message = error instanceof Error ? error.message : 'Leadline could not answer.';
      setStatus({ message: `Not copied. ${message}`, isFault: true });
    }
    setRunning(null);
  };

  const buttons = (kinds: LineKind[], about: string, all = false) =>
    FORMS.map(({ form, word }) => {
      const key = `${about} ${form}`;
      const words = all ? (form === 'plain' ? 'Copy all lines' : `All, ${word}`) : word;
      return (
        <Button
          key={form}
          className="min-h-8! px-3! py-1! text-13!"
          disabled={blocked !== null}
          aria-label={all ? words : `${word}: ${about}`}
          aria-describedby={blocked === null ? undefined : `${id}-blocked`}
          pending={running === key}
          pendingLabel="Copying…"
          onClick={() => copy(key, kinds, form)}
        >
          {words}
        </Button>
      );
    });

  return (
    <>
      {blocked ? (
        <p id={`${id}-blocked`} className="mb-2 font-semibold text-caution">
          {blocked}
        </p>
      ) : null}
      <div className="gap-10 lg:columns-2">
        {lines.map(({ kind, text }) => (
          <div key={kind} className={`break-inside-avoid pb-3 ${SIZES[kind]}`}>
            <div className="mb-1 flex flex-wrap items-center justify-between gap-2">
              <h3 className="section-heading">{LINE_KIND_NAMES[kind]}</h3>
              <span className="no-print flex flex-wrap gap-2">
                {buttons([kind], LINE_KIND_NAMES[kind].toLowerCase())}
              </span>
            </div>
            <CopyBlock>
              <div className="whitespace-pre-line">{text}</div>
            </CopyBlock>
          </div>
        ))}
      </div>
      <div className="no-print flex flex-wrap gap-2">
        {buttons(
          lines.map(({ kind }) => kind),
          'all lines',
          true,
        )}
      </div>
      <div className={status ? 'sticky bottom-0 bg-paper py-1' : undefined}>
        <CopyStatus message={status?.message ?? null} isFault={status?.isFault} />
      </div>
      {byHand === null ? null : <ByHand id={id} text={byHand} />}
    </>
  );
}

function statusOf({ kind }: Outcome, zone: string): Status {
  if (kind === 'copied')
    return { message: `Copied ${formatTime(Date.now(), zone, 'en-GB')}`, isFault: false };
  return {
    message: 'This browser does not let the page copy. The words are selected below: copy them from there.',
    isFault: true,
  };
}
