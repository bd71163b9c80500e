import clsx from 'clsx'
import Link from 'next/link'
import { useId, type ButtonHTMLAttributes, type ComponentProps, type ReactNode } from 'react'

interface Look {
  /** 'do': filled, one a view. */
  kind?: 'do' | 'plain'
  size?: 'small' | 'big'
}

const look = ({ kind = 'plain', size }: Look, off = false) => clsx('btn', !off && kind === 'do' && 'do', off && 'off', size)

type ButtonProps = Look & ButtonHTMLAttributes<HTMLButtonElement> & {
  /** Why it cannot be used now. The button stays where it is, can be reached, says why, and does nothing. */
  off?: ReactNode
  /** It was pressed and waits for its answer. */
  pending?: boolean
}

export function Button({ kind, size, off, pending = false, className, children, type = 'button', onClick, ...rest }: ButtonProps) {
  const reasonId = useId()
  if (off) {
    return (
      <button {...rest} type="button" aria-disabled="true" aria-describedby={reasonId} className={clsx(look({ size }, true), className)}>
        <span>{children}: <span id={reasonId}>{off}</span></span>
      </button>
    )
  }
  return <button {...rest} type={type} onClick={onClick} disabled={pending || rest.disabled} aria-busy={pending || undefined} className={clsx(look({ kind, size }), className)}>{children}</button>
}

type ButtonLinkProps = Look & ComponentProps<typeof Link>

/**
 * Goes somewhere and looks like a button. Nothing is fetched ahead: a page of fifty rows would ask the server for a hundred pages
 * nobody opened.
 */
export function ButtonLink({ kind, size, className, ...rest }: ButtonLinkProps) {
  return <Link prefetch={false} {...rest} className={clsx(look({ kind, size }), className)} />
}

/** A link in a sentence. */
export function TextLink({ className, ...rest }: ComponentProps<typeof Link>) {
  return <Link prefetch={false} {...rest} className={clsx('link', className)} />
}

/** Looks like a link in a sentence, changes something on this page. */
export function LinkButton({ className, type = 'button', ...rest }: ButtonHTMLAttributes<HTMLButtonElement>) {
  return <button {...rest} type={type} className={clsx('link', className)} />
}
