import { presentShare, type PresentationReason } from '@/lib/findings/present-share';
import { call, type Call } from './call';

type Input = { p: number; n: number; effective_n: number; level: number };

const suppressed: Partial<Record<PresentationReason, string>> = {
  'fewer-than-30': 'suppress: sample size below 30',
  'interval-too-wide': 'suppress: width at least .30',
  'relative-width': 'suppress: relative width above 130%',
};

/** The presentation standard of the National Center for Health Statistics (2017), series 2, number 175. */
export const presentationCalls: Record<string, Call> = {
  nchs: call(({ p, n, effective_n, level }: Input) => {
    const shown = presentShare({ p, n, nEff: effective_n, level });
    const [first] = shown.reasons;
    return {
      interval: shown.interval,
      effective_n_used: shown.nEffUsed,
      width: shown.width,
      relative_width: shown.relativeWidth,
      relative_width_complement: shown.relativeWidthOfRest,
      decision: shown.outcome === 'suppress' && first ? (suppressed[first] ?? first) : 'present',
      review: shown.reasons.includes('no-events') || shown.reasons.includes('few-clusters'),
      complement_flag: shown.restUnreliable,
    };
  }),
};
