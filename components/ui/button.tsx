import type { ComponentProps } from 'react';
import { classNames } from './class-names';

export type ButtonTone = 'primary' | 'plain' | 'caution';

type ButtonProps = ComponentProps<'button'> & {
  tone?: ButtonTone;
  /** While the work runs: the button stays focusable, says so, and takes no second press. */
  pending?: boolean;
  pendingLabel?: string;
};

export function buttonClass(tone: ButtonTone, className?: string): string {
  return classNames('button', `button-${tone}`, className);
}

export function Button({
  tone = 'plain',
  pending = false,
  pendingLabel = 'Working…',
  type = 'button',
  className,
  children,
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={pending ? 'button' : type}
      className={buttonClass(tone, className)}
      aria-disabled={pending || undefined}
      aria-busy={pending || undefined}
      onClick={pending ? undefined : onClick}
    >
      {pending ? pendingLabel : children}
    </button>
  );
}
