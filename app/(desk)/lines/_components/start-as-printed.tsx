'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { newSubmissionKey } from '@/components/forms/release/submission-key';
import { Button } from '@/components/ui/button';
import { LanguageChoice, type OfferedLanguage } from '@/components/lines/language-choice';
import type { Language } from '@/lib/domain/vocabulary';
import type { ActionResult } from '@/lib/errors';
import { useAction } from '../../../_components/use-action';
import { RefusedNote } from './refused-note';

/** For figures that have to be out before anybody has worked on them: no claim, no comparison, no chart. */
export function StartAsPrinted({
  releaseId,
  languages,
  preselectedLanguage,
  create,
}: {
  releaseId: string;
  languages: readonly OfferedLanguage[];
  preselectedLanguage: Language;
  create: (input: {
    submissionKey: string;
    releaseId: string;
    language: Language;
  }) => Promise<ActionResult<{ id: string }>>;
}) {
  const router = useRouter();
  const { run, isPending, failure } = useAction(create);
  const [language, setLanguage] = useState(preselectedLanguage);
  const [submissionKey] = useState(newSubmissionKey);
  const start = async () => {
    const result = await run({ submissionKey, releaseId, language });
    if (result.ok) router.push(`/lines/${result.value.id}`);
  };
  return (
    <section aria-label="Figures as printed" className="mt-8 max-w-form border-t border-rule pt-4">
      <p className="mb-2">
        Without a claim: shares, base, interviews, dates, pollster and sponsor in house style’s own words.
      </p>
      <LanguageChoice id="printed-language" languages={languages} value={language} onChange={setLanguage} />
      <RefusedNote failure={failure} />
      <Button pending={isPending} pendingLabel="Drafting…" onClick={start}>
        Give the figures as printed
      </Button>
    </section>
  );
}
