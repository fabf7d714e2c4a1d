import type { Core, Material, Post } from '@shared/schemas/post'
import { removePosts } from '@shared/survey/remove-post'
import type { OperationOf } from '@shared/survey/survey-operation'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { TextField } from '@/components/field'
import { sayDone } from '@/components/toast'
import { CornerField } from './corner-field'
import { formatOf } from './format-of'
import { dressedSizes } from './lumber'
import { MeasureField } from './measure-field'
import { PanelFindings } from './panel-findings'
import { PostStrengthFields } from './post-strength-fields'
import type { PanelProps } from './selection-panel'

type Fields = Omit<Post, 'id'>

const materials: readonly { value: Material; label: string }[] = [
  { value: 'softwood', label: 'Softwood' },
  { value: 'hardwood', label: 'Hardwood' },
  { value: 'veneered', label: 'Veneered' },
  { value: 'masonry', label: 'Masonry' },
  { value: 'metal', label: 'Metal' },
]
const cores: readonly { value: Core; label: string }[] = [
  { value: 'softwood', label: 'Softwood' },
  { value: 'hardwood', label: 'Hardwood' },
  { value: 'masonry', label: 'Masonry' },
  { value: 'metal', label: 'Metal' },
]

/** Sets fields of a post; an undefined one is taken away. */
export function change(id: string, fields: Partial<Fields>): OperationOf<'post.set'> {
  const given = Object.entries(fields)
  return {
    type: 'post.set',
    id,
    set: Object.fromEntries(given.filter(([, value]) => value !== undefined)),
    unset: given.flatMap(([key, value]) => (value === undefined ? [key as keyof Fields] : [])),
  }
}

/** A material with what goes with it: only a veneered post has a core and a cover of its own. */
export const materialFields = (material: Material | undefined): Partial<Fields> =>
  material === 'veneered' ? { material } : { material, core: undefined, cover: undefined }

/** One post: what it is made of, its sizes, and its corner where two runs meet. */
export function PostPanel({ view, actions, post }: PanelProps & { post: Post }) {
  const { survey, canEdit } = view
  const format = formatOf(view)
  const set = (fields: Partial<Fields>) => actions.perform(change(post.id, fields))
  const setMaterial = (material: Material) => set(materialFields(material))
  const remove = () => {
    actions.perform(removePosts(survey, [post.id]))
    sayDone(`Post ${post.id} removed, with its bays and marks.`, actions.undo)
  }
  return (
    <section aria-label={`Post ${post.id}`} className="flex flex-col gap-4">
      <h2 className="text-lg font-semibold">Post {post.id}</h2>
      <ChoiceGroup
        label="Material"
        choices={materials}
        value={post.material}
        disabled={!canEdit}
        onChange={setMaterial}
      />
      {post.material === 'veneered' ? (
        <>
          <ChoiceGroup
            label="Core under the cover"
            choices={cores}
            value={post.core}
            disabled={!canEdit}
            onChange={(core) => set({ core })}
          />
          <MeasureField
            label="Thickness of the cover"
            least="zero"
            value={post.cover}
            format={format}
            disabled={!canEdit}
            onChange={(cover) => set({ cover })}
          />
        </>
      ) : null}
      {canEdit && (
        <div role="group" aria-label="Dressed sizes" className="flex flex-wrap gap-2">
          {dressedSizes.map(({ nominal, size }) => (
            <Button
              key={nominal}
              aria-pressed={post.along === size && post.across === size}
              onClick={() => set({ along: size, across: size })}
            >
              {nominal}
            </Button>
          ))}
        </div>
      )}
      <div className="grid grid-cols-2 gap-3">
        <MeasureField
          label="Size along"
          hint="parallel to its first bay"
          value={post.along}
          format={format}
          disabled={!canEdit}
          onChange={(along) => set({ along })}
        />
        <MeasureField
          label="Size across"
          hint="at right angles"
          value={post.across}
          format={format}
          disabled={!canEdit}
          onChange={(across) => set({ across })}
        />
      </div>
      <PostStrengthFields view={view} post={post} onChange={set} />
      <CornerField view={view} actions={actions} post={post.id} />
      {canEdit && <SameForOthers view={view} actions={actions} post={post} />}
      <TextField
        key={post.note ?? ''}
        label="Note"
        defaultValue={post.note ?? ''}
        maxLength={500}
        disabled={!canEdit}
        onBlur={(event) => {
          const note = event.target.value.trim() || undefined
          if (note !== post.note) set({ note })
        }}
      />
      <PanelFindings view={view} of={{ kind: 'post', id: post.id }} />
      {canEdit && (
        <Button look="danger" onClick={remove}>
          Remove post
        </Button>
      )}
    </section>
  )
}

/** One tap gives the posts that have no material yet what this one has. */
function SameForOthers({ view, actions, post }: PanelProps & { post: Post }) {
  const others = view.survey.posts.filter(({ id, material }) => id !== post.id && material === undefined)
  if (!post.material || others.length === 0) return null
  const { material, core, cover, along, across } = post
  /** What was measured at a post itself stays. */
  const missingIn = (other: Post) =>
    Object.fromEntries(
      Object.entries({ material, core, cover, along, across }).filter(
        ([key, value]) => value !== undefined && other[key as keyof Fields] === undefined,
      ),
    )
  const apply = () => {
    actions.perform({ type: 'group', operations: others.map((other) => change(other.id, missingIn(other))) })
    sayDone(`${others.map(({ id }) => id).join(', ')} made like ${post.id}.`, actions.undo)
  }
  return (
    <Button onClick={apply}>
      The same for {others.length === 1 ? others[0]?.id : `the ${others.length} posts without material`}
    </Button>
  )
}
