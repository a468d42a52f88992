import 'server-only';
import { heldDocument } from '@/lib/charts/held-document';
import type { ThemeChoice } from '@/lib/charts/tokens';
import { readEnv } from '@/lib/env';
import { formatInstant } from '@/lib/format/date';
import { canonicalJson } from '@/lib/security/canonical';

const SAYS = 'Publication of these figures is barred by law';

/** What stands where a chart was while a ban bars it, in the form that was asked for. No figure of it. */
export function heldOf(
  part: 'page' | 'chart.svg' | 'data.json',
  untilAt: number,
  theme: ThemeChoice,
): string {
  const { LEADLINE_ZONE } = readEnv();
  const until = {
    iso: new Date(untilAt).toISOString(),
    text: formatInstant(untilAt, LEADLINE_ZONE, 'en-GB'),
  };
  if (part === 'data.json') return canonicalJson({ held: true, until: until.iso });
  if (part === 'page') return heldDocument({ theme, until, says: SAYS });
  return [
    '<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 640 60" width="640" height="60" role="img">',
    `<title>${SAYS} until ${until.text}</title>`,
    '<text x="0" y="36" font-family="system-ui, sans-serif" font-size="15" fill="#4a5c66">',
    `${SAYS} until ${until.text}</text></svg>`,
  ].join('');
}
