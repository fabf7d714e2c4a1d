import { materials, type Post } from '@shared/schemas/post'
import { removePosts } from '@shared/survey/remove-post'
import { writeLength } from '@shared/units/format-length'
import { Button } from '@/components/button'
import { sayDone } from '@/components/toast'
import { formatOf } from '../panels/format-of'
import { change as changePost, materialFields } from '../panels/post-panel'
import type { PanelProps } from '../panels/selection-panel'
import { lengthCommit } from './length-commit'
import { Cell } from './cell'
import { SelectCell } from './select-cell'
import { Sheetlike } from './sheetlike'

const choices = [{ value: '', label: '—' }, ...materials.map((value) => ({ value, label: value }))]
const cores = ['', 'softwood', 'hardwood', 'masonry', 'metal'].map((value) => ({
  value,
  label: value || '—',
}))

type SizeKey = 'along' | 'across' | 'cover'

export function PostsTable({
  view,
  actions,
  onPaste,
}: PanelProps & { onPaste: (column: SizeKey, row: string, lines: string[]) => void }) {
  const { survey, canEdit } = view
  const set = (id: string, key: keyof Omit<Post, 'id'>, value: unknown) =>
    actions.perform({
      type: 'post.set',
      id,
      set: value === undefined || value === '' ? {} : { [key]: value },
      unset: value === undefined || value === '' ? [key] : [],
    })
  const size = (post: Post, key: SizeKey, label: string) => (
    <Cell
      label={`${label} of ${post.id}`}
      value={post[key] === undefined ? '' : writeLength(post[key], formatOf(view))}
      readOnly={!canEdit}
      onCommit={lengthCommit(
        view,
        (value) => set(post.id, key, value),
        key === 'cover' ? 'zero' : 'above-zero',
      )}
      onPasteLines={(lines) => onPaste(key, post.id, lines)}
    />
  )
  const remove = (id: string) => {
    actions.perform(removePosts(survey, [id]))
    sayDone(`Post ${id} removed, with its bays and marks.`, actions.undo)
  }
  return (
    <Sheetlike caption="Posts" headers={['Post', 'Material', 'Core', 'Cover', 'Along', 'Across', '']}>
      {survey.posts.map((post) => (
        <tr key={post.id} className="border-b border-rule last:border-0">
          <th scope="row" className="px-3 text-left font-medium">
            {post.id}
          </th>
          <td>
            <SelectCell
              label={`Material of ${post.id}`}
              value={post.material ?? ''}
              choices={choices}
              disabled={!canEdit}
              onChange={(value) =>
                actions.perform(
                  changePost(post.id, materialFields(materials.find((known) => known === value))),
                )
              }
            />
          </td>
          <td>
            {post.material === 'veneered' ? (
              <SelectCell
                label={`Core of ${post.id}`}
                value={post.core ?? ''}
                choices={cores}
                disabled={!canEdit}
                onChange={(value) => set(post.id, 'core', value)}
              />
            ) : null}
          </td>
          <td>{post.material === 'veneered' ? size(post, 'cover', 'Cover') : null}</td>
          <td>{size(post, 'along', 'Size along')}</td>
          <td>{size(post, 'across', 'Size across')}</td>
          <td>
            {canEdit ? (
              <Button look="quiet" aria-label={`Remove post ${post.id}`} onClick={() => remove(post.id)}>
                Remove
              </Button>
            ) : null}
          </td>
        </tr>
      ))}
    </Sheetlike>
  )
}
