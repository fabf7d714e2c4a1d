import type { Post } from '@shared/schemas/post'
import { ChoiceGroup } from '@/components/choices'
import { SelectField } from '@/components/field'
import type { EditorView } from '../model/editor-context'

interface PostStrengthFieldsProps {
  view: EditorView
  post: Post
  onChange: (fields: Partial<Pick<Post, 'lumber' | 'railTies'>>) => void
}

const said = { true: 'yes', false: 'no', undefined: 'not said' } as const

/** What the strength of a post depends on: species and grade of a wooden core, and whether the rail ties it. */
export function PostStrengthFields({ view, post, onChange }: PostStrengthFieldsProps) {
  const { guard } = view.survey
  const core = post.material === 'veneered' ? post.core : post.material
  const isWood = core === 'softwood' || core === 'hardwood'
  return (
    <>
      {isWood ? <LumberSelect view={view} post={post} onChange={onChange} /> : null}
      <ChoiceGroup
        label="The top rail ties this post"
        choices={[
          { value: 'guard', label: `As the guard: ${said[`${guard.railTies}`]}` },
          { value: 'yes', label: 'Yes' },
          { value: 'no', label: 'No' },
        ]}
        value={post.railTies === undefined ? 'guard' : post.railTies ? 'yes' : 'no'}
        disabled={!view.canEdit}
        onChange={(value) => onChange({ railTies: value === 'guard' ? undefined : value === 'yes' })}
      />
    </>
  )
}

/** From the house rules; without a choice the first of them stands for the post. */
function LumberSelect({ view, post, onChange }: PostStrengthFieldsProps) {
  const { lumber } = view.rules
  const isKnown = post.lumber === undefined || lumber.some(({ id }) => id === post.lumber)
  return (
    <SelectField
      label="Species and grade"
      hint="The grade stamp and the engineer decide."
      value={post.lumber ?? ''}
      disabled={!view.canEdit}
      error={isKnown ? undefined : 'The house rules no longer have this one. Choose another.'}
      onChange={(event) => onChange({ lumber: event.target.value || undefined })}
    >
      <option value="">Not said: {lumber[0]?.name ?? 'none in the house rules'}</option>
      {isKnown ? null : <option value={post.lumber}>{post.lumber}</option>}
      {lumber.map(({ id, name }) => (
        <option key={id} value={id}>
          {name}
        </option>
      ))}
    </SelectField>
  )
}
