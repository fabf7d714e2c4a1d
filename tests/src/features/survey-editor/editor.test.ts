import { describe, expect, it } from 'vitest'
import { makeBaySchema } from '@shared/schemas/bay'
import { storedQuantities } from '@shared/schemas/quantities'
import { applyOperation } from '@shared/survey/apply-operation'
import { newBay } from '@shared/survey/new-bay'
import { screen, TestEditor } from '../../../support/test-editor'

/** Three posts in a row, as a surveyor taps them. */
function threePosts(): TestEditor {
  const test = new TestEditor()
  test.editor.chooseTool('post')
  return test.tap([200, 900]).tap([600, 900]).tap([1000, 900])
}

describe('put post', () => {
  it('puts a post where the foot is tapped, standing up, in one undo step', () => {
    const test = new TestEditor()
    test.editor.chooseTool('post')
    test.tap([200, 900])
    expect(test.survey.posts.map(({ id }) => id)).toEqual(['P1'])
    const mark = test.survey.photos[0]!.posts['P1']!
    expect(mark.base).toEqual([200, 900])
    expect(mark.top![1]).toBeLessThan(900)
    expect(test.state.selection).toEqual({ kind: 'post', id: 'P1' })
    expect(test.sent).toHaveLength(1)
    test.editor.undo()
    expect(test.survey.posts).toEqual([])
    expect(test.survey.photos[0]!.posts).toEqual({})
  })

  it('draws a post from foot to top, whichever end came first', () => {
    const test = new TestEditor()
    test.editor.chooseTool('post')
    test.drag([300, 900], [310, 700]).drag([700, 650], [690, 880])
    expect(test.survey.photos[0]!.posts).toEqual({
      P1: { base: [300, 900], top: [310, 700] },
      P2: { base: [690, 880], top: [700, 650] },
    })
  })

  it('selects a post that is there instead of putting a second one on it', () => {
    const test = threePosts().tap([601, 901])
    expect(test.survey.posts).toHaveLength(3)
    expect(test.state.selection).toEqual({ kind: 'post', id: 'P2' })
  })

  it('makes later posts as tall as their neighbours look', () => {
    const test = new TestEditor()
    test.editor.chooseTool('post')
    test.drag([200, 1000], [200, 800]).drag([600, 800], [600, 700]).tap([900, 900])
    expect(test.survey.photos[0]!.posts['P3']!.top).toEqual([900, 750])
  })

  it('marks a known post on another photo without making a new one', () => {
    const test = threePosts()
    test.editor.perform({ type: 'photo.add', photo: { id: 'F2', file: 'side.jpg', posts: {} } })
    test.editor.choosePhoto('F2')
    test.editor.setPlacing('P1')
    test.tap([400, 700])
    expect(test.survey.posts).toHaveLength(3)
    expect(Object.keys(test.survey.photos[1]!.posts)).toEqual(['P1'])
    expect(test.state.placing).toBe('P2')
  })

  it('leaves nothing when the drawing is cancelled', () => {
    const test = new TestEditor()
    test.editor.chooseTool('post')
    test.down([200, 900]).move([200, 800])
    expect(test.state.draft).not.toBeNull()
    test.key('Escape').up([200, 700])
    expect(test.survey.posts).toEqual([])
    expect([test.state.draft, test.state.loupe]).toEqual([null, null])
    expect(test.state.canUndo).toBe(false)
    expect(test.sent).toEqual([])
  })
})

describe('join bay', () => {
  it('joins posts by taps, going on from the last, and by drawing', () => {
    const taps = threePosts()
    taps.editor.chooseTool('bay')
    taps.tap([200, 890]).tap([600, 890]).tap([1000, 890])
    expect(taps.survey.bays.map(({ from, to }) => [from, to])).toEqual([
      ['P1', 'P2'],
      ['P2', 'P3'],
    ])
    const drawn = threePosts()
    drawn.editor.chooseTool('bay')
    drawn.drag([600, 890], [1000, 890])
    expect(drawn.survey.bays).toEqual([newBay({ id: 'B1', from: 'P2', to: 'P3' })])
  })

  it('selects the bay of posts that are joined already', () => {
    const test = threePosts()
    test.editor.chooseTool('bay')
    test.drag([200, 890], [600, 890]).drag([600, 890], [200, 890])
    expect(test.survey.bays).toHaveLength(1)
    expect(test.state.selection).toEqual({ kind: 'bay', id: 'B1' })
  })

  it('lays runs in the same step and takes them back with it', () => {
    const test = new TestEditor({
      survey: threePosts().survey,
      runsFor: (survey) =>
        survey.runs.length > 0
          ? []
          : [
              {
                type: 'run.add',
                run: { id: 'R1', bays: ['B1'], cable: 'c1', readings: [], cables: { heights: [] as never } },
              },
            ],
    })
    test.editor.chooseTool('bay')
    test.drag([200, 890], [600, 890])
    expect(test.survey.runs.map(({ id }) => id)).toEqual(['R1'])
    test.editor.undo()
    expect([test.survey.bays, test.survey.runs]).toEqual([[], []])
  })

  it('ends on bare photo with nothing joined', () => {
    const test = threePosts()
    test.editor.chooseTool('bay')
    test.tap([200, 890]).tap([600, 300])
    expect(test.editor.toolState).toBe('idle')
    expect(test.survey.bays).toEqual([])
  })
})

describe('mark stair and rectangle', () => {
  it('turns a bay into a stair and back', () => {
    const test = threePosts()
    test.editor.chooseTool('bay')
    test.drag([200, 890], [600, 890])
    test.editor.chooseTool('stair')
    test.tap([400, 770])
    expect(test.survey.bays[0]!.kind).toBe('stair')
    test.tap([400, 770])
    expect(test.survey.bays[0]!.kind).toBe('level')
  })

  it('gathers four corners and waits for the size', () => {
    const test = new TestEditor()
    test.editor.chooseTool('rectangle')
    test.tap([100, 1000]).tap([150, 900]).tap([400, 900]).tap([500, 1000])
    expect(test.state.draft).toEqual({
      kind: 'rectangle',
      corners: [
        [100, 1000],
        [150, 900],
        [400, 900],
        [500, 1000],
      ],
    })
    expect(test.state.selection).toEqual({ kind: 'rectangle', id: 'F1' })
    expect(test.survey.photos[0]!.rectangle).toBeUndefined()
    test.key('Escape')
    expect(test.state.draft).toBeNull()
  })
})

describe('select and move', () => {
  it('moves one end or the whole mark, one step each', () => {
    const test = threePosts()
    const before = test.survey
    test.editor.chooseTool('select')
    test.drag([200, 900], [230, 930])
    expect(test.survey.photos[0]!.posts['P1']!.base).toEqual([230, 930])
    expect(test.survey.photos[0]!.posts['P1']!.top).toEqual(before.photos[0]!.posts['P1']!.top)
    test.editor.undo()
    expect(test.survey).toEqual(before)
    test.editor.redo()
    expect(test.survey.photos[0]!.posts['P1']!.base).toEqual([230, 930])
  })

  it('moves the photo when bare photo is dragged', () => {
    const test = threePosts()
    test.editor.chooseTool('select')
    const { left } = test.editor.camera
    test.editor.pointerDown({ id: 1, kind: 'mouse', at: screen(700, 100) })
    test.editor.pointerMove({ id: 1, kind: 'mouse', at: screen(720, 100) })
    test.editor.pointerUp({ id: 1, kind: 'mouse', at: screen(720, 100) })
    expect(test.editor.camera.left).toBeCloseTo(left + 20, 6)
    expect(test.sent).toHaveLength(3)
  })

  it('cancels a drag when a second finger comes down, and pinches about it', () => {
    const test = threePosts()
    test.editor.chooseTool('select')
    const before = test.survey
    const zoom = test.editor.camera.zoom
    test.editor.pointerDown({ id: 1, kind: 'touch', at: screen(100, 450) })
    test.editor.pointerMove({ id: 1, kind: 'touch', at: screen(140, 450) })
    test.editor.pointerDown({ id: 2, kind: 'touch', at: screen(340, 450) })
    test.editor.pointerMove({ id: 2, kind: 'touch', at: screen(540, 450) })
    expect(test.editor.camera.zoom).toBeCloseTo(zoom * 2, 6)
    test.editor.pointerUp({ id: 2, kind: 'touch', at: screen(540, 450) })
    test.editor.pointerMove({ id: 1, kind: 'touch', at: screen(200, 450) })
    test.editor.pointerUp({ id: 1, kind: 'touch', at: screen(200, 450) })
    expect(test.survey).toBe(before)
    expect([test.state.draft, test.state.loupe]).toEqual([null, null])
  })

  it('keeps the place under the wheel where it is', () => {
    const test = threePosts()
    const at = screen(321, 123)
    const under = () => [
      (at.screenX - test.editor.camera.left) / test.editor.camera.zoom,
      (at.screenY - test.editor.camera.top) / test.editor.camera.zoom,
    ]
    const before = under()
    test.editor.wheel({ at, deltaX: 0, deltaY: -240, pinching: false })
    expect(test.editor.camera.zoom).toBeGreaterThan(0.5)
    under().forEach((value, i) => expect(value).toBeCloseTo(before[i]!, 6))
  })
})

describe('the keyboard', () => {
  it('does what the hand does: put, join, move, remove, undo', () => {
    const test = new TestEditor()
    test.key('p').key('Enter').key('Enter')
    expect(test.survey.posts).toHaveLength(1)
    for (let i = 0; i < 20; i += 1) test.key('ArrowRight', { shift: true })
    test.key('Enter')
    expect(test.survey.posts).toHaveLength(2)
    const first = test.survey.photos[0]!.posts['P1']!.base
    test.key('v').key('n').key('ArrowRight', { shift: true })
    expect(test.survey.photos[0]!.posts['P1']!.base[0]).toBe(first[0] + 10)
    test.key('Delete')
    expect(test.survey.posts.map(({ id }) => id)).toEqual(['P2'])
    test.key('z', { ctrl: true })
    expect(test.survey.posts.map(({ id }) => id)).toEqual(['P1', 'P2'])
  })
})

describe('what comes from elsewhere', () => {
  it('never enters the history, and a step that no longer fits is dropped', () => {
    const test = threePosts()
    const elsewhere = applyOperation(
      applyOperation(test.survey, { type: 'photo.unmark', photo: 'F1', post: 'P3' }),
      { type: 'post.remove', id: 'P3' },
    )
    test.editor.receive(elsewhere)
    expect(test.state.selection).toEqual({ kind: 'none' })
    test.editor.undo()
    expect(test.refusals).toHaveLength(1)
    test.editor.undo()
    expect(test.survey.posts.map(({ id }) => id)).toEqual(['P1'])
  })

  it('changes nothing for somebody who may only look', () => {
    const test = new TestEditor({ survey: threePosts().survey, canEdit: false })
    test.editor.chooseTool('post')
    test.tap([1500, 900]).key('v').drag([200, 900], [400, 900])
    expect(test.sent).toEqual([])
    expect(test.survey.posts).toHaveLength(3)
  })
})

it('makes a bay exactly as the schema would', () => {
  const bare = { id: 'B1', from: 'P1', to: 'P2' }
  expect(newBay(bare)).toEqual(makeBaySchema(storedQuantities).parse(bare))
})
