/** What a sheet claims: one finding of one release question. */
export type Claim =
  | { kind: 'lead'; pair: [string, string] }
  | { kind: 'change'; option: string }
  | { kind: 'lead-change'; pair: [string, string] }
  | { kind: 'threshold'; option: string; pct: number };

/**
 * Claims that the judgement of a whole release supports beside those of a check document. A net score is the first
 * name less the second, a gap the share in the first group less that in the second; an empty name of a group is
 * everyone else in the sample.
 */
export type ReleaseClaim =
  | Claim
  | { kind: 'net-score'; pair: [string, string] }
  | { kind: 'net-score-change'; pair: [string, string] }
  | { kind: 'gap'; question: string; option: string; groups: [string, string] };
export type ClaimKind = ReleaseClaim['kind'];

/** Every kind of line, in the order of the screen. */
export const LINE_KINDS = [
  'headline',
  'standfirst',
  'body',
  'change-sentence',
  'caveat',
  'caveat-short',
  'caveat-one-breath',
  'method-note',
  'chart-title',
  'alt-text',
  'spoken-line',
  'newsletter-line',
  'correction-notice',
] as const;
export type LineKind = (typeof LINE_KINDS)[number];
export const LINE_KIND_NAMES: Record<LineKind, string> = {
  headline: 'Headline claim',
  standfirst: 'Standfirst',
  body: 'Body sentence',
  'change-sentence': 'Change sentence',
  caveat: 'Caveat',
  'caveat-short': 'Caveat, short',
  'caveat-one-breath': 'Caveat in one breath',
  'method-note': 'Method note',
  'chart-title': 'Chart title',
  'alt-text': 'Alt text',
  'spoken-line': 'Spoken line',
  'newsletter-line': 'Newsletter line',
  'correction-notice': 'Correction notice',
};

/** What every sheet is drafted with. */
export const STANDING_LINE_KINDS = [
  'headline',
  'body',
  'caveat',
  'method-note',
  'chart-title',
  'alt-text',
] as const satisfies readonly LineKind[];
export type StandingLineKind = (typeof STANDING_LINE_KINDS)[number];

export type RequestedLineKind = Exclude<LineKind, StandingLineKind>;
/** What is drafted when somebody asks for it. */
export const REQUESTED_LINE_KINDS: readonly RequestedLineKind[] = LINE_KINDS.filter(
  (kind): kind is RequestedLineKind => !STANDING_LINE_KINDS.some((standing) => standing === kind),
);

/** Lines that a sheet or its embed cannot do without: they may be edited, not knocked out. */
export const REQUIRED_LINE_KINDS: readonly LineKind[] = ['caveat', 'chart-title', 'alt-text'];

/** `agreed`: two people agreed to words that become printable with the correction they wait for. */
export const LINE_STATES = [
  'draft',
  'filed',
  'sent-back',
  'agreed',
  'cleared',
  'superseded',
  'pulled',
] as const;
export type LineState = (typeof LINE_STATES)[number];
export const LINE_STATE_NAMES: Record<LineState, string> = {
  draft: 'Draft',
  filed: 'Filed',
  'sent-back': 'Sent back',
  agreed: 'Agreed, waits for its correction',
  cleared: 'Cleared',
  superseded: 'Superseded',
  pulled: 'Pulled',
};

export type LineText = { kind: LineKind; text: string };

/** Lines in the order of the screen, whatever the order they were made in. */
export function inScreenOrder<Line>(lines: readonly Line[], kindOf: (line: Line) => LineKind): Line[] {
  const placeOf = (line: Line) => LINE_KINDS.indexOf(kindOf(line));
  return [...lines].sort((one, other) => placeOf(one) - placeOf(other));
}
