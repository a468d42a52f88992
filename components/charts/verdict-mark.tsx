import type { Verdict } from '@/lib/findings/check-types';

export const VERDICT_NAMES: Record<Verdict, string> = {
  holds: 'Holds',
  fragile: 'Fragile',
  'does-not-hold': 'Not shown',
  'cannot-be-tested': 'Cannot be tested',
};

/** The verdict by shape and word, then by colour: disc, half disc, ring, dashed ring. */
export function VerdictMark({ verdict, name = VERDICT_NAMES[verdict] }: { verdict: Verdict; name?: string }) {
  return (
    <span className={`verdict verdict-${verdict}`}>
      <svg aria-hidden="true" viewBox="0 0 14 14" width="14" height="14">
        <Shape verdict={verdict} />
      </svg>
      {name}
    </span>
  );
}

function Shape({ verdict }: { verdict: Verdict }) {
  const ring = { cx: 7, cy: 7, r: 6, fill: 'none', stroke: 'currentColor', strokeWidth: 1.6 };
  switch (verdict) {
    case 'holds':
      return <circle cx={7} cy={7} r={6.6} fill="currentColor" />;
    case 'fragile':
      return (
        <>
          <circle {...ring} />
          <path d="M7 1A6 6 0 0 0 7 13Z" fill="currentColor" />
        </>
      );
    case 'does-not-hold':
      return <circle {...ring} />;
    case 'cannot-be-tested':
      return <circle {...ring} strokeDasharray="2.7 2" />;
  }
}
