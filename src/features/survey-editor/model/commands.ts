import { removeBays } from '@shared/survey/remove-bay'
import { removePosts } from '@shared/survey/remove-post'
import { type ToolName, toolLabels, toolNames } from '../tools/tool-names'
import type { Editor } from './editor'
import { stepSelection, walkOrder } from './selection'

/** A key as a command knows it: `Mod` is Ctrl, or Command on a Mac. */
export interface Shortcut {
  key: string
  mod?: boolean
  shift?: boolean
}

/** Something the keyboard can do: data, so that the list of keys and the keys themselves cannot differ. */
export interface Command {
  name: string
  shortcuts: readonly Shortcut[]
  when: (editor: Editor) => boolean
  perform: (editor: Editor) => void
}

const always = () => true
const editing = (editor: Editor) => editor.getSnapshot().canEdit
const withPhoto = (editor: Editor) => editor.getSnapshot().photoId !== null

const toolKeys: Record<ToolName, string> = {
  select: 'v',
  post: 'p',
  bay: 'b',
  stair: 's',
  rectangle: 'r',
  pan: 'm',
}

const toolCommands = toolNames.map((tool): Command => ({
  name: `Tool: ${toolLabels[tool]}`,
  shortcuts: [{ key: toolKeys[tool] }],
  when: (editor) => editing(editor) || tool === 'select' || tool === 'pan',
  perform: (editor) => editor.chooseTool(tool),
}))

const arrows = [
  ['ArrowLeft', 'left', -1, 0],
  ['ArrowRight', 'right', 1, 0],
  ['ArrowUp', 'up', 0, -1],
  ['ArrowDown', 'down', 0, 1],
] as const

const nudgeCommands = arrows.flatMap(([key, side, dx, dy]): Command[] => [
  {
    name: `Move the mark or the cursor ${side}`,
    shortcuts: [{ key }],
    when: withPhoto,
    perform: (editor) => editor.nudge(dx, dy),
  },
  {
    name: `Move ${side} ten times as far`,
    shortcuts: [{ key, shift: true }],
    when: withPhoto,
    perform: (editor) => editor.nudge(dx * 10, dy * 10),
  },
])

const step = (by: 1 | -1) => (editor: Editor) => {
  const { survey, photoId, selection } = editor.getSnapshot()
  editor.select(stepSelection(walkOrder(survey, photoId), selection, by))
}

const removable = (editor: Editor) => {
  const { kind } = editor.getSnapshot().selection
  return editing(editor) && (kind === 'post' || kind === 'bay')
}

function removeSelected(editor: Editor): void {
  const { survey, selection } = editor.getSnapshot()
  if (selection.kind === 'post') editor.perform(removePosts(survey, [selection.id]))
  if (selection.kind === 'bay') editor.perform(removeBays(survey, [selection.id]))
}

export const commands: readonly Command[] = [
  ...toolCommands,
  {
    name: 'Undo',
    shortcuts: [{ key: 'z', mod: true }],
    when: (editor) => editor.getSnapshot().canUndo,
    perform: (editor) => editor.undo(),
  },
  {
    name: 'Redo',
    shortcuts: [
      { key: 'z', mod: true, shift: true },
      { key: 'y', mod: true },
    ],
    when: (editor) => editor.getSnapshot().canRedo,
    perform: (editor) => editor.redo(),
  },
  {
    name: 'Stop what is being drawn, or let go of the selection',
    shortcuts: [{ key: 'Escape' }],
    when: always,
    perform: (editor) => {
      if (!editor.cancel()) editor.select({ kind: 'none' })
    },
  },
  {
    name: 'Tap with the tool at the cursor',
    shortcuts: [{ key: 'Enter' }],
    when: withPhoto,
    perform: (editor) => editor.tapAtCursor(),
  },
  { name: 'Next mark', shortcuts: [{ key: 'n' }], when: withPhoto, perform: step(1) },
  { name: 'Mark before', shortcuts: [{ key: 'n', shift: true }], when: withPhoto, perform: step(-1) },
  {
    name: 'Remove the selected post or bay',
    shortcuts: [{ key: 'Delete' }, { key: 'Backspace' }],
    when: removable,
    perform: removeSelected,
  },
  ...nudgeCommands,
  {
    name: 'Nearer',
    shortcuts: [{ key: '+' }, { key: '=' }],
    when: withPhoto,
    perform: (editor) => editor.zoomBy(1.25),
  },
  { name: 'Farther', shortcuts: [{ key: '-' }], when: withPhoto, perform: (editor) => editor.zoomBy(0.8) },
  { name: 'Whole photo', shortcuts: [{ key: '0' }], when: withPhoto, perform: (editor) => editor.fitPhoto() },
]

export const shortcutName = ({ key, mod = false, shift = false }: Shortcut): string =>
  [mod ? 'Ctrl' : '', shift ? 'Shift' : '', key.length === 1 ? key.toUpperCase() : key]
    .filter((part) => part !== '')
    .join(' + ')

interface KeyPress {
  key: string
  ctrlKey: boolean
  metaKey: boolean
  shiftKey: boolean
}

/** The command a key press asks for. A sign that itself needs Shift (`+`, `?`) is the same with or without it. */
export function commandFor(press: KeyPress, known: readonly Command[] = commands): Command | undefined {
  const key = press.key.length === 1 ? press.key.toLowerCase() : press.key
  const mod = press.ctrlKey || press.metaKey
  const isSign = key.length === 1 && !/[a-z]/.test(key)
  return known.find(({ shortcuts }) =>
    shortcuts.some(
      (shortcut) =>
        shortcut.key === key &&
        (shortcut.mod ?? false) === mod &&
        (isSign || (shortcut.shift ?? false) === press.shiftKey),
    ),
  )
}
