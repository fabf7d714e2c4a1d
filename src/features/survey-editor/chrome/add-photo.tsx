import { Camera, ImagePlus } from 'lucide-react'
import { type ChangeEvent, useId, useRef } from 'react'
import { classes } from '@/components/classes'
import { photoFault } from '../model/photo-fault'

interface AddPhotoProps {
  /** Gets a file that looks like a photo. */
  onFile: (file: File) => void
  /** Gets a sentence about one that does not. */
  onFault: (message: string) => void
  /** 0 to 1 while a photo is on its way. */
  progress: number | null
  /** Both ways side by side where there is no photo yet, one small button else. */
  look: 'first' | 'further'
}

const button =
  'inline-flex min-h-12 cursor-pointer items-center justify-center gap-2 rounded border px-4 font-medium has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-chalk'

/** Takes a photo with the camera or chooses a file. */
export function AddPhoto({ onFile, onFault, progress, look }: AddPhotoProps) {
  if (progress !== null) {
    return (
      <p role="status" className={classes(button, 'border-rule bg-card')}>
        Storing the photo, {Math.round(progress * 100)} %
      </p>
    )
  }
  const take = (file: File) => {
    const fault = photoFault(file)
    if (fault) onFault(fault)
    else onFile(file)
  }
  if (look === 'further') {
    return (
      <>
        {/* A desk has no camera to point at a deck. */}
        <FileButton
          onFile={take}
          camera
          className={classes(button, 'border-rule bg-card/95 pointer-fine:hidden')}
        >
          <Camera aria-hidden="true" className="size-5" /> Take photo
        </FileButton>
        <FileButton onFile={take} className={classes(button, 'border-rule bg-card/95')}>
          <ImagePlus aria-hidden="true" className="size-5" /> Add photo
        </FileButton>
      </>
    )
  }
  return (
    <div className="flex flex-wrap justify-center gap-2">
      <FileButton onFile={take} camera className={classes(button, 'border-spruce bg-spruce text-on-spruce')}>
        <Camera aria-hidden="true" className="size-5" /> Take photo
      </FileButton>
      <FileButton onFile={take} className={classes(button, 'border-rule bg-card')}>
        <ImagePlus aria-hidden="true" className="size-5" /> Choose file
      </FileButton>
    </div>
  )
}

interface FileButtonProps {
  onFile: (file: File) => void
  camera?: boolean
  className: string
  children: React.ReactNode
}

function FileButton({ onFile, camera = false, className, children }: FileButtonProps) {
  const id = useId()
  const input = useRef<HTMLInputElement>(null)
  const chosen = (event: ChangeEvent<HTMLInputElement>) => {
    const [file] = event.target.files ?? []
    if (file) onFile(file)
    // The same file may be chosen again.
    if (input.current) input.current.value = ''
  }
  return (
    <label htmlFor={id} className={className}>
      <input
        ref={input}
        id={id}
        type="file"
        accept="image/jpeg,image/png,image/webp,image/heic,image/heif"
        className="sr-only"
        onChange={chosen}
        {...(camera ? { capture: 'environment' as const } : {})}
      />
      {children}
    </label>
  )
}
