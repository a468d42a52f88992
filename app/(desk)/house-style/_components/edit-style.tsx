'use client';

import { type EditorDraft, StyleEditor } from '@/components/forms/house-style/style-editor';
import type { ActionResult } from '@/lib/errors';
import { loadPage } from '../../../_components/load-page';

export function EditStyle({
  draft,
  propose,
}: {
  draft: EditorDraft;
  propose: (input: unknown) => Promise<ActionResult<unknown>>;
}) {
  return (
    <StyleEditor draft={draft} propose={propose} onProposed={() => loadPage(`/house-style/${draft.id}`)} />
  );
}
