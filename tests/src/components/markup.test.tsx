import { renderToStaticMarkup } from 'react-dom/server'
import { expect, test } from 'vitest'
import { inches, millimetres } from '@shared/units/length'
import { Button } from '@/components/button'
import { CheckboxGroup } from '@/components/choices'
import { TextField } from '@/components/field'
import { FindingMark } from '@/components/finding-mark'
import { Length } from '@/components/length'
import { LengthField } from '@/components/length-field'
import { StageStepper } from '@/components/stage-stepper'
import { Table } from '@/components/table'
import { Progress, TautLine } from '@/components/taut-line'

const render = renderToStaticMarkup
const spoken = (html: string) => /<span class="sr-only">(.*?)<\/span>/.exec(html)?.[1]

test('a length is spoken as plain text with its unit and drawn with a true fraction', () => {
  const html = render(<Length value={inches(148.375)} format={{ style: 'feet' }} />)
  expect(spoken(html)).toBe('12&#x27; 4 3/8&quot;')
  expect(html).toMatch(/<sup[^>]*>3<\/sup><span>⁄<\/span><sub[^>]*>8<\/sub>/)
  expect(html).toContain('<span aria-hidden="true">12′')
})

test('a metric length shows its unit too', () => {
  const html = render(<Length value={millimetres(3770.5)} format={{ style: 'millimetres' }} />)
  expect(spoken(html)).toBe('3770.5 mm')
  expect(html).toContain('>mm</span>')
})

test('measured, computed and struck lengths look different, and a struck one is said to be struck', () => {
  const [measured, computed, struck] = (['measured', 'computed', 'struck'] as const).map((look) =>
    render(<Length value={inches(64.25)} format={{ style: 'inches' }} look={look} />),
  )
  expect(measured).toContain('text-ink')
  expect(computed).toContain('text-spruce')
  expect(struck).toContain('after:border-t-2')
  expect(spoken(struck ?? '')).toBe('struck: 64 1/4&quot;')
})

test('hint and error of a field are tied to its control', () => {
  const html = render(<TextField label="E-mail" hint="Where the link goes." error="Write an address." />)
  const [, described = ''] = /aria-describedby="([^"]*)"/.exec(html) ?? []
  const ids = described.split(' ')
  expect(ids).toHaveLength(2)
  for (const id of ids) expect(html).toContain(`<p id="${id}"`)
  expect(html).toContain('aria-invalid="true"')
  const [, control = ''] = /<label for="([^"]*)"/.exec(html) ?? []
  expect(control).not.toBe('')
  expect(html).toContain(`<input id="${control}"`)
})

test('a field without hint and error points at nothing and is not invalid', () => {
  const html = render(<TextField label="E-mail" />)
  expect(html).not.toContain('aria-describedby')
  expect(html).toContain('aria-invalid="false"')
})

test('an error of a group of checkboxes is tied to the group', () => {
  const html = render(
    <CheckboxGroup label="Roles" error="Choose one role or more.">
      {null}
    </CheckboxGroup>,
  )
  const [, id = ''] = /<fieldset[^>]*aria-describedby="([^"]*)"/.exec(html) ?? []
  expect(id).not.toBe('')
  expect(html).toContain(`<p id="${id}" role="alert"`)
})

test('a length field shows what it holds as people write it', () => {
  const format = { style: 'inches', finest: 16 } as const
  const html = render(
    <LengthField label="Clear gap" value={inches(46.5)} onChange={() => {}} format={format} />,
  )
  expect(html).toContain('value="46 1/2&quot;"')
})

test('a busy button says so and stays reachable by the keyboard', () => {
  const busy = render(<Button busy>Save</Button>)
  expect(busy).toContain('aria-busy="true"')
  expect(busy).toContain('aria-disabled="true"')
  expect(busy).not.toContain(' disabled=""')
  expect(render(<Button disabled>Save</Button>)).toContain(' disabled=""')
  expect(render(<Button>Save</Button>)).not.toContain(' aria-disabled=')
})

test('every level of finding has a shape and a name of its own', () => {
  const marks = (['note', 'check', 'stop'] as const).map((level) => render(<FindingMark level={level} />))
  const shapes = marks.map((html) => /<(circle|path)[^>]*>/.exec(html)?.[0])
  expect(new Set(shapes).size).toBe(3)
  expect(marks.map((html) => /aria-label="(\w+)"/.exec(html)?.[1])).toEqual(['note', 'check', 'stop'])
})

test('the stepper marks one step, and a lost job has none', () => {
  const html = render(<StageStepper stage="price" />)
  expect(html.match(/aria-current="step"/g)).toHaveLength(1)
  expect(html).toMatch(/aria-current="step"[^>]*>price</)
  // price is the third of seven steps
  expect(html).toMatch(/x2="33\.3+\d*%"/)
  expect(render(<StageStepper stage="lost" />)).not.toContain('<ol')
})

test('the line is taut as far as the work has come and never beyond its ticks', () => {
  const ends = (share: number) =>
    [...render(<TautLine share={share} />).matchAll(/x2="([\d.]+%)"/g)].at(-1)?.[1]
  expect([-1, 0, 0.25, 1, 7].map(ends)).toEqual(['0%', '0%', '25%', '100%', '100%'])
})

test('progress says its figure', () => {
  const html = render(<Progress label="Sending the photo" share={0.424} />)
  expect(html).toContain('role="progressbar"')
  expect(html).toContain('aria-label="Sending the photo"')
  expect(html).toContain('aria-valuenow="42"')
})

test('a column that can be sorted has a button for it, another has none, and nothing is sorted at first', () => {
  const html = render(
    <Table
      caption="Cables"
      columns={[
        { key: 'cable', header: 'Cable', cell: (row) => row },
        { key: 'cut', header: 'Cut', cell: (row) => row, sortBy: (row) => row },
      ]}
      rows={['b', 'a']}
      keyOf={(row) => row}
    />,
  )
  expect(html.match(/<button/g)).toHaveLength(1)
  expect(html).not.toContain('aria-sort')
  expect(html.indexOf('>b</td>')).toBeLessThan(html.indexOf('>a</td>'))
  expect(html).toContain('<caption')
})
