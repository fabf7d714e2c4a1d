import { describe, expect, it } from 'vitest'
import type { Finding } from '@shared/schemas/finding'
import { foundAt, verdictOf } from '../../../../src/features/checks/verdict'

const finding = (level: Finding['level'], code: string, where: Finding['where']): Finding => ({
  level,
  code,
  where,
  text: code,
})
const findings = [
  finding('check', 'post-overstressed', { run: 'R1', post: 'P2' }),
  finding('check', 'post-top-load', { post: 'P2' }),
  finding('stop', 'opening-top', { run: 'R1', bay: 'B1' }),
  finding('note', 'temperature', { run: 'R1' }),
]

describe('what was found of a place', () => {
  it('is that of its run, and what is of no run', () => {
    expect([...foundAt(findings, { run: 'R1', post: 'P2' }).keys()]).toEqual([
      'post-overstressed',
      'post-top-load',
    ])
    expect([...foundAt(findings, { run: 'R2', post: 'P2' }).keys()]).toEqual(['post-top-load'])
  })
  it('of a run is nothing of its bays and posts', () => {
    expect([...foundAt(findings, { run: 'R1' }).keys()]).toEqual(['temperature'])
  })
})

describe('a verdict', () => {
  const found = new Map([
    ['a', 'note'],
    ['b', 'stop'],
  ] as const)
  it('is the gravest of its codes', () => {
    expect(verdictOf(found, 'a', 'b')).toBe('stop')
    expect(verdictOf(found, 'a')).toBe('note')
  })
  it('holds where nothing was found', () => {
    expect(verdictOf(found, 'c')).toBe('holds')
  })
})
