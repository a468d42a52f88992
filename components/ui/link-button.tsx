import Link from 'next/link';
import type { ComponentProps } from 'react';
import { buttonClass, type ButtonTone } from './button';

/** A link that looks like the next step; it navigates, so it stays a link. */
export function LinkButton({
  tone = 'plain',
  className,
  ...rest
}: ComponentProps<typeof Link> & { tone?: ButtonTone }) {
  return <Link {...rest} className={buttonClass(tone, className)} />;
}
