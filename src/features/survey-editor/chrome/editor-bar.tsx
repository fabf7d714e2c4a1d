import {
  ArrowLeft,
  CircleHelp,
  ClipboardList,
  EllipsisVertical,
  ImageOff,
  History,
  OctagonAlert,
  Redo2,
  Settings2,
  Table2,
  Undo2,
} from 'lucide-react'
import { Link } from 'react-router-dom'
import { IconButton } from '@/components/button'
import { Menu, MenuItem } from '@/components/menu'
import { SaveState } from './save-state'

interface EditorBarProps {
  title: string
  back: { to: string; label: string }
  saving: { unsent: number; waiting: boolean }
  undo: (() => void) | null
  redo: (() => void) | null
  onTable: () => void
  onHistory: () => void
  onCutList: () => void
  onFindings: () => void
  /** How many stops and checks there are, in words. */
  found: string
  onSettings: () => void
  onKeys: () => void
  /** None where there is no photo, or for somebody who may only look. */
  onRemovePhoto: (() => void) | null
}

/** The bar above the photo: where one is, how far it is saved, and what is not a tool. */
export function EditorBar({
  title,
  back,
  saving,
  undo,
  redo,
  onTable,
  onHistory,
  onCutList,
  onFindings,
  found,
  onSettings,
  onKeys,
  onRemovePhoto,
}: EditorBarProps) {
  return (
    <header className="flex items-center gap-1 border-b border-rule bg-card px-1">
      <Link to={back.to} aria-label={back.label} className="flex size-12 items-center justify-center rounded">
        <ArrowLeft aria-hidden="true" />
      </Link>
      <div className="min-w-0 flex-1 py-1">
        <h1 className="truncate text-base font-semibold">{title}</h1>
        <SaveState {...saving} />
      </div>
      <IconButton label="Undo" disabled={!undo} onClick={() => undo?.()}>
        <Undo2 aria-hidden="true" />
      </IconButton>
      <IconButton label="Redo" disabled={!redo} onClick={() => redo?.()}>
        <Redo2 aria-hidden="true" />
      </IconButton>
      <Menu
        trigger={
          <IconButton label="More of this survey">
            <EllipsisVertical aria-hidden="true" />
          </IconButton>
        }
      >
        <MenuItem onSelect={onCutList}>
          <ClipboardList aria-hidden="true" className="size-5" /> Cut list
        </MenuItem>
        <MenuItem onSelect={onFindings}>
          <OctagonAlert aria-hidden="true" className="size-5" /> Findings{found}
        </MenuItem>
        <MenuItem onSelect={onTable}>
          <Table2 aria-hidden="true" className="size-5" /> The survey as a table
        </MenuItem>
        <MenuItem onSelect={onHistory}>
          <History aria-hidden="true" className="size-5" /> History
        </MenuItem>
        <MenuItem onSelect={onSettings}>
          <Settings2 aria-hidden="true" className="size-5" /> Guard and units
        </MenuItem>
        {onRemovePhoto ? (
          <MenuItem onSelect={onRemovePhoto}>
            <ImageOff aria-hidden="true" className="size-5" /> Remove this photo
          </MenuItem>
        ) : null}
        <MenuItem onSelect={onKeys}>
          <CircleHelp aria-hidden="true" className="size-5" /> Keys
        </MenuItem>
      </Menu>
    </header>
  )
}
