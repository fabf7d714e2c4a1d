import { useEffect, useRef } from 'react'
import type { Captions } from '../model/captions'
import type { Editor } from '../model/editor'
import { listenToHand } from './hand'
import { Scene } from './scene'

interface PhotoCanvasProps {
  editor: Editor
  captions: Captions
  /** Address of the upright picture of the photo shown; none while there is no photo. */
  picture: string | null
  /** Told when the picture could not be fetched. */
  onPictureFailed: () => void
}

/** The photo with its marks. What is on it is also in the table, which is what a screen reader is led to. */
export default function PhotoCanvas({ editor, captions, picture, onPictureFailed }: PhotoCanvasProps) {
  const element = useRef<HTMLDivElement>(null)
  const scene = useRef<Scene>(null)

  useEffect(() => {
    const container = element.current
    if (!container) return
    const made = new Scene(container, editor)
    scene.current = made
    const stop = listenToHand(container, editor)
    const sizes = new ResizeObserver(([entry]) => {
      if (entry) made.resize(entry.contentRect.width, entry.contentRect.height)
    })
    sizes.observe(container)
    const redraw = () => made.redraw()
    const dark = window.matchMedia('(prefers-color-scheme: dark)')
    dark.addEventListener('change', redraw)
    void document.fonts.ready.then(redraw)
    return () => {
      dark.removeEventListener('change', redraw)
      sizes.disconnect()
      stop()
      made.destroy()
      scene.current = null
    }
  }, [editor])

  useEffect(() => scene.current?.setCaptions(captions), [captions])

  useEffect(() => {
    scene.current?.setImage(null)
    if (picture === null) return
    const image = new Image()
    image.onload = () => scene.current?.setImage(image)
    image.onerror = onPictureFailed
    image.src = picture
    return () => {
      image.onload = null
      image.onerror = null
    }
  }, [picture, onPictureFailed])

  return (
    <div
      ref={element}
      role="application"
      tabIndex={0}
      aria-label="Photo with posts and bays. Press question mark for the keys; the table holds the same survey."
      className="absolute inset-0 touch-none overflow-hidden bg-steel/20 select-none"
    />
  )
}
