/** A source file, by name without folder: `tape-limit.ts`. */
export interface SourceFile {
  name: string
  /** The folder below shared/calculation, `checks/`. */
  place?: string
  text: string
}

export interface Page {
  name: string
  text: string
}

interface Described {
  name: string
  summary: string
  fields: [label: string, text: string][]
}

const labels: Record<string, string> = {
  'Formula:': 'Formula',
  'Units:': 'Units',
  'Source:': 'Source',
  '@returns': 'Answers',
  '@throws': 'Refuses',
  '@example': 'Example',
}

/** A docstring directly before an exported function or constant. */
const exported = /\/\*\*((?:(?!\*\/)[\s\S])*)\*\/\s*export (?:async )?(?:function|const) (\w+)/g

/** The calculations of a file: exported functions and figures whose docstring names a source or a formula. */
function describedIn(text: string): Described[] {
  return [...text.matchAll(exported)].flatMap(([, comment = '', name = '']) => {
    const described = readDocstring(name, comment)
    return described.fields.some(([label]) => label === 'Formula') ? [described] : []
  })
}

function readDocstring(name: string, comment: string): Described {
  const described: Described = { name, summary: '', fields: [] }
  let current: [label: string, text: string] | undefined
  for (const line of comment.split('\n').map((part) => part.replace(/^\s*\*?\s?/, '').trimEnd())) {
    const key = Object.keys(labels).find((start) => line.startsWith(start))
    if (key) {
      current = [labels[key] ?? key, line.slice(key.length).trim()]
      described.fields.push(current)
    } else if (line.startsWith('@')) {
      current = undefined
    } else if (current) {
      current[1] = line === '' ? current[1] : `${current[1]} ${line.trim()}`.trim()
    } else if (described.fields.length === 0) {
      described.summary = `${described.summary}${line === '' ? '\n\n' : ` ${line}`}`
    }
  }
  described.summary = described.summary
    .split('\n\n')
    .map((part) => part.trim())
    .filter(Boolean)
    .join('\n\n')
  return described
}

const titleOf = (file: string): string => {
  const words = file.replace(/\.ts$/, '').replaceAll('-', ' ')
  return words.charAt(0).toUpperCase() + words.slice(1)
}

function page({ name: file, place = '' }: SourceFile, described: readonly Described[]): string {
  const parts = described.map(({ name, summary, fields }) =>
    [`## ${name}`, summary, ...fields.map(([label, text]) => `**${label}**: ${text}`)].join('\n\n'),
  )
  return (
    [
      `# ${titleOf(file)}`,
      `From \`shared/calculation/${place}${file}\`; written by \`npm run docs\`.`,
      ...parts,
      '',
    ]
      .join('\n\n')
      .trimEnd() + '\n'
  )
}

/** The pages of docs/calculations: one per file of shared/calculation that holds a calculation, and an index. */
export function calculationPages(sources: readonly SourceFile[]): Page[] {
  const described = [...sources]
    .sort((a, b) => (a.name < b.name ? -1 : 1))
    .map((source) => ({ source, calculations: describedIn(source.text) }))
    .filter(({ calculations }) => calculations.length > 0)
  const list = described.map(({ source: { name }, calculations }) => {
    const about = calculations[0]?.summary.split('\n\n')[0] ?? ''
    return `- [${titleOf(name)}](${name.replace(/\.ts$/, '.md')}): ${about}`
  })
  const intro =
    'One page for each calculation, written from its docstring by `npm run docs`. Lengths are nanometres inside the program; sections are those of its specification.'
  const index = { name: 'README.md', text: ['# Calculations', intro, list.join('\n')].join('\n\n') + '\n' }
  return [
    index,
    ...described.map(({ source, calculations }) => ({
      name: source.name.replace(/\.ts$/, '.md'),
      text: page(source, calculations),
    })),
  ]
}
