import { classes } from '@/components/classes'

export interface StripPhoto {
  id: string
  /** Address of its thumbnail; none while it is being stored. */
  thumbnail: string | null
}

interface PhotoStripProps {
  photos: readonly StripPhoto[]
  current: string | null
  onChoose: (id: string) => void
}

/** The survey's photos, to change between; nothing where there is only one. */
export function PhotoStrip({ photos, current, onChoose }: PhotoStripProps) {
  if (photos.length < 2) return null
  return (
    <ul aria-label="Photos" className="flex gap-1 overflow-x-auto rounded bg-card/90 p-1">
      {photos.map(({ id, thumbnail }) => (
        <li key={id}>
          <button
            type="button"
            aria-label={`Photo ${id}`}
            aria-pressed={id === current}
            onClick={() => onChoose(id)}
            className={classes(
              'block size-14 overflow-hidden rounded border-2 text-xs',
              id === current ? 'border-chalk' : 'border-transparent',
            )}
          >
            {thumbnail ? <img src={thumbnail} alt="" className="size-full object-cover" /> : id}
          </button>
        </li>
      ))}
    </ul>
  )
}
