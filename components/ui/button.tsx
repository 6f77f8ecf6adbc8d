import Link from 'next/link';
import type { ComponentProps } from 'react';
import { type ButtonTone, buttonClass } from './button-class';

export { type ButtonTone, buttonClass };

type ButtonProps = ComponentProps<'button'> & { tone?: ButtonTone };

export function Button({ tone = 'plain', className, type = 'button', ...rest }: ButtonProps) {
  return <button type={type} className={buttonClass(tone, className)} {...rest} />;
}

type ButtonLinkProps = ComponentProps<typeof Link> & { tone?: ButtonTone };

/** A link that leads on, drawn like a button. */
export function ButtonLink({ tone = 'plain', className, ...rest }: ButtonLinkProps) {
  return <Link className={buttonClass(tone, className)} {...rest} />;
}
