'use client';

import { createContext, type ReactNode, useContext, useDeferredValue, useMemo } from 'react';
import { type Control, get, useFormState, useWatch } from 'react-hook-form';
import { policyFor } from '@/lib/domain/house-style';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { Policy } from '@/lib/findings/check-types';
import { comparisonQuery } from './comparison-query';
import { messageOf } from './field-path';
import type { FormChoices } from './form-choices';
import type { ReleaseForm } from './form-values';
import { type LiveDocument, liveDocument } from './live-document';
import { judged, type LiveFindings } from './live-findings';
import { type ComparisonState, useComparison } from './use-comparison';

export type Live = { findings: LiveFindings; comparison: ComparisonState; isNewRace: boolean };

const LiveContext = createContext<Live | null>(null);
const RefusalContext = createContext<{ field: string; message: string } | null>(null);

/**
 * Computes what the numbers support as they are typed, behind the typing: the fields stay as they are, only what
 * reads the findings is drawn again.
 */
export function LiveProvider({
  control,
  choices,
  personId,
  releaseId,
  children,
}: {
  control: Control<ReleaseForm>;
  choices: FormChoices;
  personId: string;
  /** Of a release that is being changed; empty for a new one. */
  releaseId: string;
  children: ReactNode;
}) {
  const values = useDeferredValue(useWatch({ control }) as ReleaseForm);
  const comparison = useComparison(comparisonQuery(values, releaseId), personId);
  const previous = comparison.kind === 'answered' ? comparison.compared.previous : null;
  const { races } = choices;
  const policy = policyUnder(choices, values, previous);
  const chosen = values.race.kind === 'existing' ? values.race.id : null;
  const thresholds = races.find((race) => race.id === chosen)?.thresholds ?? [];
  // As text, so that typing what no figure rests on computes and draws nothing anew.
  const wanted = JSON.stringify(liveDocument(values, { policy, previous, thresholds }));
  const findings = useMemo(() => judged(JSON.parse(wanted) as LiveDocument | null), [wanted]);
  const isNewRace = values.race.kind === 'new';
  const live = useMemo(() => ({ findings, comparison, isNewRace }), [findings, comparison, isNewRace]);
  const [field, message] = findings.kind === 'refused' ? [findings.field, findings.message] : [null, ''];
  const refusal = useMemo(() => (field === null ? null : { field, message }), [field, message]);
  return (
    <RefusalContext value={refusal}>
      <LiveContext value={live}>{children}</LiveContext>
    </RefusalContext>
  );
}

/** The desk's policy for the kinds of sample at hand, as the service applies it to what is logged. */
function policyUnder(
  { policy, comparisonBasis }: FormChoices,
  values: ReleaseForm,
  previous: ReleaseFacts | null,
): Policy {
  if (!comparisonBasis) return policy;
  const own = values.sampleSource || 'unknown';
  const sources = previous ? [own, previous.sampleSource] : [own];
  return policyFor({ ...policy, comparisonBasis }, sources);
}

export function useLive(): Live {
  const live = useContext(LiveContext);
  if (!live) throw new Error('useLive requires a LiveProvider');
  return live;
}

/** What is wrong with one field: as the form was sent, else as the engine refuses it while it is typed. */
export function useFault(control: Control<ReleaseForm>, path: string): string | undefined {
  const { errors } = useFormState({ control });
  const refusal = useContext(RefusalContext);
  const sent = messageOf(get(errors, path)) ?? messageOf(get(errors, `${path}.root`));
  if (sent) return sent;
  return refusal?.field === path ? refusal.message : undefined;
}
