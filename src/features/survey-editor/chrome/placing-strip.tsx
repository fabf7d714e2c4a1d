import { classes } from '@/components/classes'

interface PlacingStripProps {
  /** Posts of the survey that are not marked on this photo. */
  posts: readonly string[]
  placing: string | null
  onPlace: (post: string | null) => void
}

/** On a further photo: which of the known posts the next tap marks, or a new one. */
export function PlacingStrip({ posts, placing, onPlace }: PlacingStripProps) {
  if (posts.length === 0) return null
  const chip = (pressed: boolean) =>
    classes(
      'min-h-12 shrink-0 rounded border px-3',
      pressed ? 'border-chalk bg-chalk-ground font-medium text-chalk' : 'border-rule bg-card',
    )
  return (
    <div role="group" aria-label="Mark a post of this survey" className="flex gap-1 overflow-x-auto">
      <button
        type="button"
        className={chip(placing === null)}
        aria-pressed={placing === null}
        onClick={() => onPlace(null)}
      >
        New post
      </button>
      {posts.map((post) => (
        <button
          key={post}
          type="button"
          className={chip(placing === post)}
          aria-pressed={placing === post}
          onClick={() => onPlace(post)}
        >
          This is {post}
        </button>
      ))}
    </div>
  )
}
