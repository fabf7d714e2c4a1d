import {
  BriefcaseBusiness,
  Building2,
  CircleUserRound,
  LogOut,
  Ruler,
  Scale,
  SunMoon,
  Users,
  Wrench,
} from 'lucide-react'
import { type ComponentType, useState } from 'react'
import { Link, NavLink, Outlet } from 'react-router-dom'
import type { Session } from '@shared/schemas/session'
import { classes } from '@/components/classes'
import { Menu, MenuItem, MenuLabel, MenuLink } from '@/components/menu'
import { SkipLink } from '@/components/skip-link'
import { Brand } from '@/components/taut-line'
import { sayProblem } from '@/components/toast'
import { useSignOut } from '@/features/session/api/sign-out'
import { messageOf } from '@/lib/api-error'
import { applyTheme, readTheme, type Theme } from '@/lib/theme'
import { OfflineBanner } from './offline-banner'
import { paths } from './paths'

interface Place {
  to: string
  label: string
  Icon: ComponentType<{ className?: string }>
}

const places: Place[] = [
  { to: paths.jobs, label: 'Jobs', Icon: BriefcaseBusiness },
  { to: paths.hardware, label: 'Hardware', Icon: Wrench },
  { to: paths.houseRules, label: 'House rules', Icon: Ruler },
  { to: paths.people, label: 'People', Icon: Users },
  { to: paths.company, label: 'Company', Icon: Building2 },
]

/** On a desk there is room for the rules of the code too; on a phone the house rules lead to them. */
const deskPlaces: Place[] = places.toSpliced(3, 0, {
  to: paths.guardRules,
  label: 'Guard rules',
  Icon: Scale,
})

/** The frame of every page but the editor: a bar at the top on a desk, one under the thumb on a phone. */
export default function Frame({ session }: { session: Session }) {
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <header className="sticky top-0 z-30 border-b border-rule bg-paper print:hidden">
        <div className="mx-auto flex h-14 max-w-6xl items-center gap-4 px-4">
          <Link to={paths.jobs} aria-label="Tautbook, to the jobs" className="rounded">
            <Brand />
          </Link>
          <nav aria-label="Main" className="hidden flex-1 gap-1 md:flex">
            {deskPlaces.map(({ to, label }) => (
              <NavLink
                key={to}
                to={to}
                className={({ isActive }) =>
                  classes(
                    'flex h-14 items-center border-b-2 px-3',
                    isActive
                      ? 'border-spruce font-medium text-spruce'
                      : 'border-transparent text-soft hover:text-ink',
                  )
                }
              >
                {label}
              </NavLink>
            ))}
          </nav>
          <div className="ml-auto">
            <AccountMenu session={session} />
          </div>
        </div>
      </header>
      <OfflineBanner />
      <main id="content" tabIndex={-1} className="flex-1 pb-20 outline-none md:pb-0">
        <Outlet />
      </main>
      <nav
        aria-label="Main"
        className="fixed inset-x-0 bottom-0 z-30 flex border-t border-rule bg-card pb-[env(safe-area-inset-bottom)] md:hidden print:hidden"
      >
        {places.map(({ to, label, Icon }) => (
          <NavLink
            key={to}
            to={to}
            className={({ isActive }) =>
              classes(
                'flex min-h-14 flex-1 flex-col items-center justify-center gap-0.5 text-xs',
                isActive ? 'font-semibold text-spruce' : 'text-soft',
              )
            }
          >
            <Icon aria-hidden="true" className="size-6" />
            {label}
          </NavLink>
        ))}
      </nav>
    </div>
  )
}

const nextTheme: Record<Theme, Theme> = { system: 'light', light: 'dark', dark: 'system' }
const themeNames: Record<Theme, string> = { system: 'as the device', light: 'light', dark: 'dark' }

function AccountMenu({ session }: { session: Session }) {
  const [theme, setTheme] = useState(readTheme)
  const signOut = useSignOut()
  const turnTheme = () => {
    const next = nextTheme[theme]
    applyTheme(next)
    setTheme(next)
  }
  return (
    <Menu
      trigger={
        <button
          type="button"
          aria-label={`Account of ${session.person.name}`}
          className="flex size-12 items-center justify-center rounded md:w-auto md:gap-2 md:px-3"
        >
          <CircleUserRound aria-hidden="true" />
          <span className="hidden md:inline">{session.person.name}</span>
        </button>
      }
    >
      <MenuLabel>
        {session.person.name}
        <br />
        {session.company.name}
      </MenuLabel>
      <MenuLink to={paths.account}>
        <CircleUserRound aria-hidden="true" className="size-5" /> Account
      </MenuLink>
      <MenuItem onSelect={turnTheme}>
        <SunMoon aria-hidden="true" className="size-5" /> Colours: {themeNames[theme]}
      </MenuItem>
      <MenuItem
        onSelect={() => signOut.mutate(undefined, { onError: (error) => sayProblem(messageOf(error)) })}
      >
        <LogOut aria-hidden="true" className="size-5" /> Sign out
      </MenuItem>
    </Menu>
  )
}
