import { Button } from '@/components/button'

/** A photo that was chosen and could not be sent. */
export interface UnsentPhoto {
  id: number
  name: string
  /** What happened and what to do. */
  fault: string
}

interface UnsentPhotosProps {
  photos: readonly UnsentPhoto[]
  /** Another one is on its way. */
  busy: boolean
  onSend: (id: number) => void
  onRemove: (id: number) => void
}

/** Photos kept on this screen until they are sent. */
export function UnsentPhotos({ photos, busy, onSend, onRemove }: UnsentPhotosProps) {
  if (photos.length === 0) return null
  return (
    <ul aria-label="Photos not sent yet" className="flex w-full max-w-md flex-col gap-2">
      {photos.map(({ id, name, fault }) => (
        <li key={id} role="alert" className="rounded border border-marker bg-marker-ground p-3 text-sm">
          <p>
            <strong className="font-medium">{name}</strong> is kept on this screen and was not sent. {fault}
          </p>
          <div className="mt-2 flex gap-2">
            <Button disabled={busy} onClick={() => onSend(id)}>
              Send again
            </Button>
            <Button look="quiet" onClick={() => onRemove(id)}>
              Remove
            </Button>
          </div>
        </li>
      ))}
    </ul>
  )
}
