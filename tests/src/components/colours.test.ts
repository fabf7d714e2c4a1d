import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { expect, test } from 'vitest'

const root = path.resolve(import.meta.dirname, '../../..')
const styles = readFileSync(path.join(root, 'src/styles.css'), 'utf8')

/** The table of the design: token, light, dark. */
const design: [token: string, light: string, dark: string][] = [
  ['paper', '#FAF8F3', '#101615'],
  ['card', '#FFFFFF', '#18211F'],
  ['rule', '#DDD8CC', '#2C3835'],
  ['ink', '#17211F', '#ECEFEA'],
  ['ink-soft', '#4A5753', '#A9B5AF'],
  ['spruce', '#0F5A4E', '#6FC7B5'],
  ['steel', '#5E6B73', '#9BA8B0'],
  ['marker', '#8A5200', '#FFC977'],
  ['marker-ground', '#FFF1D6', '#3A2A0C'],
  ['stop', '#A3262A', '#FF9B93'],
  ['stop-ground', '#FCE7E5', '#3D1616'],
  ['chalk', '#1F5FA8', '#8DBDF2'],
]

type Theme = 'light' | 'dark'

const tokens = new Map(
  [...styles.matchAll(/--([\w-]+): light-dark\((#\w{6}), (#\w{6})\)/g)].map(
    ([, name = '', light = '', dark = '']) => [name, { light, dark }],
  ),
)
const colour = (name: string, theme: Theme): string => {
  const token = tokens.get(name)
  if (!token) throw new Error(`styles.css has no token ${name}.`)
  return token[theme]
}

test.each(design)('%s is the colour of the design, light and dark', (name, light, dark) => {
  expect(colour(name, 'light').toUpperCase()).toBe(light)
  expect(colour(name, 'dark').toUpperCase()).toBe(dark)
})

/** WCAG 2.2, relative luminance and contrast ratio. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const share = parseInt(hex.slice(at, at + 2), 16) / 255
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}

function contrast(one: string, other: string): number {
  const [light = 0, dark = 0] = [luminance(one), luminance(other)].sort((a, b) => b - a)
  return (light + 0.05) / (dark + 0.05)
}

test('black on white has the contrast that WCAG gives it', () => {
  expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 10)
})

const pairs: [atLeast: number, what: string, front: string, back: string][] = [
  [7, 'measured figures', 'ink', 'paper'],
  [7, 'measured figures', 'ink', 'card'],
  [7, 'computed figures', 'spruce', 'paper'],
  [7, 'computed figures', 'spruce', 'card'],
  [4.5, 'labels', 'ink-soft', 'paper'],
  [4.5, 'labels', 'ink-soft', 'card'],
  [4.5, 'the main action', 'on-spruce', 'spruce'],
  [4.5, 'findings to check', 'marker', 'marker-ground'],
  [4.5, 'text of findings', 'ink', 'marker-ground'],
  [4.5, 'findings that stop', 'stop', 'stop-ground'],
  [4.5, 'text of findings', 'ink', 'stop-ground'],
  [4.5, 'faults at fields', 'stop', 'paper'],
  [4.5, 'faults at fields', 'stop', 'card'],
  [4.5, 'what is chosen', 'ink', 'chalk-ground'],
  [4.5, 'pressed icons', 'chalk', 'chalk-ground'],
  [3, 'edges of controls', 'steel', 'paper'],
  [3, 'edges of controls', 'steel', 'card'],
  [3, 'the focus ring', 'chalk', 'paper'],
  [3, 'the focus ring', 'chalk', 'card'],
]

test.each(pairs)('%d : 1 or more for %s: %s on %s', (atLeast, _what, front, back) => {
  for (const theme of ['light', 'dark'] as const) {
    const ratio = contrast(colour(front, theme), colour(back, theme))
    expect(ratio, `${front} on ${back}, ${theme}`).toBeGreaterThanOrEqual(atLeast)
  }
})

test('no colour stands anywhere but in the stylesheet', () => {
  const sources = readdirSync(path.join(root, 'src'), { recursive: true, encoding: 'utf8' })
    .filter((name) => /\.tsx?$/.test(name))
    .map((name) => path.join('src', name))
  expect(sources.length).toBeGreaterThan(20)
  const literal = /['"`\s[(:](#([0-9a-f]{3}|[0-9a-f]{6}|[0-9a-f]{8})\b|(rgba?|hsla?|oklch)\()/i
  const found = [...sources, 'tailwind.config.ts'].filter((name) =>
    literal.test(readFileSync(path.join(root, name), 'utf8')),
  )
  expect(found).toEqual([])
})

test('nothing that prints is in a layer, where the tokens of the screen would win', () => {
  const layers = styles.slice(styles.indexOf('@layer'))
  expect(styles.indexOf('@media print')).toBeGreaterThan(styles.lastIndexOf("[data-theme='dark']"))
  expect(styles.indexOf('@media print')).toBeLessThan(styles.indexOf('@layer'))
  expect(layers).not.toMatch(/^\s+--(paper|card|ink|spruce|rule)/m)
})
