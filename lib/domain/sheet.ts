/** What a sheet claims: one finding of one release question. */
export type Claim =
  | { kind: 'lead'; pair: [string, string] }
  | { kind: 'change'; option: string }
  | { kind: 'lead-change'; pair: [string, string] }
  | { kind: 'threshold'; option: string; pct: number };

export const LINE_KINDS = ['headline', 'body', 'caveat', 'method-note', 'chart-title', 'alt-text'] as const;
export type LineKind = (typeof LINE_KINDS)[number];
export const LINE_KIND_NAMES: Record<LineKind, string> = {
  headline: 'Headline claim',
  body: 'Body sentence',
  caveat: 'Caveat',
  'method-note': 'Method note',
  'chart-title': 'Chart title',
  'alt-text': 'Alt text',
};
/** Lines that a sheet or its embed cannot do without: they may be edited, not knocked out. */
export const REQUIRED_LINE_KINDS: readonly LineKind[] = ['caveat', 'chart-title', 'alt-text'];

export const LINE_STATES = ['draft', 'filed', 'sent-back', 'cleared', 'superseded', 'pulled'] as const;
export type LineState = (typeof LINE_STATES)[number];
export const LINE_STATE_NAMES: Record<LineState, string> = {
  draft: 'Draft',
  filed: 'Filed',
  'sent-back': 'Sent back',
  cleared: 'Cleared',
  superseded: 'Superseded',
  pulled: 'Pulled',
};

export type LineText = { kind: LineKind; text: string };
