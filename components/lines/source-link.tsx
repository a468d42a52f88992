import type { Disclosed } from '@/lib/domain/disclosed';
import { said } from './said';

/** The document that a release was read in, by the name of its host. */
export function SourceLink({ url }: { url: Disclosed<string> }) {
  if (url.status !== 'given') return said(url, String);
  return (
    <a href={url.value} target="_blank" rel="noopener noreferrer" className="wrap-anywhere">
      {hostOf(url.value)}
      <span className="sr-only"> (opens in a new tab)</span>
    </a>
  );
}

function hostOf(url: string): string {
  return URL.canParse(url) ? new URL(url).host : url;
}
