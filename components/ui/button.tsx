import Link from 'next/link';
import type { ComponentProps } from 'react';

export type ButtonLook = 'action' | 'plain' | 'quiet' | 'alarm';
export type ButtonSize = 'desk' | 'field';

/** `field` is for gloves: 64 px. Everything else is at least 44 px high. */
const SIZES: Record<ButtonSize, string> = {
  desk: 'min-h-11 px-4 text-base',
  field: 'min-h-16 px-5 text-lg',
};

const LOOKS: Record<ButtonLook, string> = {
  action: 'border-[1.5px] border-action bg-action text-on-action hover:underline',
  plain: 'border-[1.5px] border-ink bg-paper text-ink hover:bg-ink hover:text-paper',
  quiet:
    'border-[1.5px] border-transparent px-1 text-ink underline decoration-1 underline-offset-4',
  alarm: 'border-[1.5px] border-alarm bg-paper text-alarm hover:bg-alarm hover:text-on-alarm',
};

/** The classes of a button, for what only looks like one. */
export function buttonClass(look: ButtonLook = 'plain', size: ButtonSize = 'desk'): string {
  return [
    'inline-flex cursor-pointer items-center justify-center gap-2 text-center font-semibold',
    'disabled:cursor-not-allowed disabled:border-dashed disabled:border-rule disabled:bg-transparent disabled:text-ink-soft disabled:no-underline',
    LOOKS[look],
    look === 'quiet' ? SIZES[size].replace(/px-\d/, '') : SIZES[size],
  ].join(' ');
}

type Own = { look?: ButtonLook; size?: ButtonSize };

/** A button that does something here. Never submits a form unless its type says so. */
export function Button({
  look,
  size,
  className = '',
  type = 'button',
  ...rest
}: ComponentProps<'button'> & Own) {
  return <button type={type} className={`${buttonClass(look, size)} ${className}`} {...rest} />;
}

/** A link that is the page's next step and therefore looks like a button. */
export function ButtonLink({
  look,
  size,
  className = '',
  ...rest
}: ComponentProps<typeof Link> & Own) {
  return <Link className={`${buttonClass(look, size)} ${className}`} {...rest} />;
}
