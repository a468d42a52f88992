'use client';

import { useRef, useState } from 'react';
import { diffParts } from '../../lines/diff-parts';
import { Button } from '../../ui/button';
import { WordDiff } from '../../ui/word-diff';
import { LINE_KIND_NAMES, type LineKind } from '@/lib/domain/sheet';
import type { Verdict } from '@/lib/findings/check-types';
import { fetchJson } from '../release/fetch-json';
import { VERDICT_NAMES } from './decision-words';

type LiveChange = {
  sheet: string;
  race: string;
  pollster: string;
  verdict: { before: Verdict; after: Verdict | null };
  lines: { kind: LineKind; before: string; after: string }[];
};
type Step = { changes: LiveChange[]; seen: number; total: number; next: number | null; isBounded: boolean };

/** What would read differently among what is live: looked through step by step, with a way to stop. */
export function LivePreview({ id }: { id: string }) {
  const [changes, setChanges] = useState<LiveChange[]>([]);
  const [step, setStep] = useState<Step | null>(null);
  const [isRunning, setRunning] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const isStopped = useRef(false);

  const run = async () => {
    isStopped.current = false;
    setRunning(true);
    setProblem(null);
    setChanges([]);
    try {
      for (let from: number | null = 0; from !== null && !isStopped.current;) {
        const found: Step = (await fetchJson(`/api/desk/house-style/${id}/live?from=${from}`, {
          method: 'GET',
        })) as Step;
        setChanges((before) => [...before, ...found.changes]);
        setStep(found);
        from = found.next;
      }
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'It could not be looked through.');
    }
    setRunning(false);
  };

  return (
    <div>
      <p className="mb-2 max-w-prose text-soft">
        Live sheets are drafted again on their frozen figures. Nothing that is live changes; new drafts follow
        the new version.
      </p>
      <div className="flex flex-wrap gap-3">
        <Button onClick={() => void run()} pending={isRunning} pendingLabel="Looking through…">
          {step ? 'Look through again' : 'Look through what is live'}
        </Button>
        {isRunning ? <Button onClick={() => (isStopped.current = true)}>Stop</Button> : null}
      </div>
      <p role="status" className="mt-2">
        {problem ?? (step ? summary(step, changes.length, isRunning) : '')}
      </p>
      <ul>
        {changes.map((change) => (
          <li key={change.sheet} className="border-b border-rule py-3">
            <ChangedSheet change={change} />
          </li>
        ))}
      </ul>
    </div>
  );
}

function ChangedSheet({ change }: { change: LiveChange }) {
  const { before, after } = change.verdict;
  return (
    <>
      <p className="font-semibold">
        <a href={`/lines/${change.sheet}`}>{change.race}</a>
        <span className="font-normal text-soft">, {change.pollster}</span>
      </p>
      {before === after ? null : (
        <p>
          Verdict: {VERDICT_NAMES[before]} → {after ? VERDICT_NAMES[after] : 'no such finding any more'}
        </p>
      )}
      <dl>
        {change.lines.map((line) => (
          <div key={line.kind} className="mt-2">
            <dt className="text-13 text-soft">{LINE_KIND_NAMES[line.kind]}</dt>
            <dd className="max-w-prose font-serif">
              <WordDiff parts={diffParts(line.before, line.after)} />
            </dd>
          </div>
        ))}
      </dl>
    </>
  );
}

function summary(step: Step, found: number, isRunning: boolean): string {
  const looked = `${step.seen} of ${step.total} live ${step.total === 1 ? 'sheet' : 'sheets'} looked at`;
  const differ = found === 0 ? 'none would read differently' : `${found} would read differently`;
  const bound = step.isBounded && !isRunning ? ' Only the newest were looked at.' : '';
  return `${looked}; ${differ}.${bound}`;
}
