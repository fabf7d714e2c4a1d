import { describe, expect, it } from 'vitest'
import { commandFor, commands, shortcutName } from '../../../../src/features/survey-editor/model/commands'
import { keeping } from '../../../../src/features/survey-editor/model/editor-state'
import { TestEditor } from '../../../support/test-editor'

describe('commands', () => {
  it('have no key twice', () => {
    const keys = commands.flatMap(({ shortcuts }) => shortcuts.map(shortcutName))
    expect(keys.filter((key, i) => keys.indexOf(key) !== i)).toEqual([])
  })

  it('are found by the key that their list shows', () => {
    for (const command of commands) {
      for (const { key, mod = false, shift = false } of command.shortcuts) {
        expect(commandFor({ key, ctrlKey: mod, metaKey: false, shiftKey: shift })?.name).toBe(command.name)
      }
    }
  })

  it('leave other keys alone', () => {
    expect(commandFor({ key: 'p', ctrlKey: true, metaKey: false, shiftKey: false })).toBeUndefined()
    expect(commandFor({ key: 'F5', ctrlKey: false, metaKey: false, shiftKey: false })).toBeUndefined()
  })
})

it('says of every part of the state where it may be kept', () => {
  expect(Object.keys(keeping).sort()).toEqual(Object.keys(new TestEditor().state).sort())
})
