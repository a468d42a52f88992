import type { ActionResult } from '@/lib/errors';
import type { SetTerms } from './terms-form';

type Action<Input, Value> = (input: Input) => Promise<ActionResult<Value>>;
type Line = { kind: string; text: string; knockedOut: boolean };
type Override = { reason: string; marks: { kind: string; rule: string; phrase: string }[] };
type Filing = {
  id: string;
  version: number;
  basisHash: string;
  lines: Line[];
  /** An editor's reason to file what the wording check does not support. */
  override?: Override | null;
};
type Reading = { id: string; hash: string };

/** What the screen of a sheet can do; the page hands the actions in. */
export type SheetActions = {
  add: Action<{ id: string; version: number; kind: string }, { version: number }>;
  file: Action<Filing, { hash: string; version: number }>;
  change: Action<Filing, { hash: string; version: number }>;
  clear: Action<Reading, { outcome: 'cleared' | 'agreed' | 'returned' }>;
  sendBack: Action<Reading & { comment: string; lines?: { kind: string; reason: string }[] }, void>;
  pull: Action<{ id: string; reason: string }, void>;
  revise: Action<{ id: string; version: number }, { version: number }>;
  discard: Action<{ id: string }, void>;
  embed: Action<{ sheetId: string }, { id: string }>;
  comment: Action<unknown, { id: string }>;
  settle: Action<{ id: string }, void>;
  terms: SetTerms;
  review: Action<{ id: string }, void>;
};
