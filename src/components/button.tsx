import type { ButtonHTMLAttributes, ReactNode } from 'react'
import { Link, type LinkProps } from 'react-router-dom'
import { classes } from './classes'

export type ButtonLook = 'primary' | 'secondary' | 'quiet' | 'danger'

const looks: Record<ButtonLook, string> = {
  primary: 'bg-spruce text-on-spruce border-spruce hover:opacity-90',
  secondary: 'bg-card text-ink border-steel hover:border-ink',
  quiet: 'bg-transparent text-spruce border-transparent hover:bg-card',
  danger: 'bg-card text-stop border-stop hover:bg-stop-ground',
}

export const buttonClasses = (look: ButtonLook, className?: string): string =>
  classes(
    'inline-flex min-h-12 items-center justify-center gap-2 rounded border px-4 py-2 text-base font-medium',
    'disabled:cursor-not-allowed disabled:opacity-50 aria-busy:cursor-progress aria-busy:opacity-75',
    looks[look],
    className,
  )

interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  look?: ButtonLook
  /** Work is under way: the button says so and cannot be pressed again. */
  busy?: boolean
}

export function Button({
  look = 'secondary',
  busy = false,
  className,
  children,
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      type="button"
      className={buttonClasses(look, className)}
      // Not `disabled`: that would take the keyboard's place on the page away while the work is under way.
      aria-disabled={busy || undefined}
      aria-busy={busy || undefined}
      {...rest}
      // A form is sent by pressing its button, also when Enter does it.
      onClick={busy ? (event) => event.preventDefault() : onClick}
    >
      {children}
      {busy && <span aria-hidden="true">…</span>}
    </button>
  )
}

/** A link that looks like a button, for going somewhere. */
export function ButtonLink({ look = 'secondary', className, ...rest }: LinkProps & { look?: ButtonLook }) {
  return <Link className={buttonClasses(look, className)} {...rest} />
}

interface IconButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  /** What it does, for everybody who cannot see the icon. */
  label: string
  children: ReactNode
  pressed?: boolean
}

export function IconButton({ label, children, pressed, className, ...rest }: IconButtonProps) {
  return (
    <button
      type="button"
      aria-label={label}
      aria-pressed={pressed}
      title={label}
      className={classes(
        'inline-flex size-12 shrink-0 items-center justify-center rounded border',
        'disabled:cursor-not-allowed disabled:opacity-40',
        // One or the other: of two colours on one element the stylesheet's order would choose, not this line.
        pressed === true
          ? 'border-chalk bg-chalk-ground text-chalk'
          : 'border-transparent text-ink hover:border-rule',
        className,
      )}
      {...rest}
    >
      {children}
    </button>
  )
}
