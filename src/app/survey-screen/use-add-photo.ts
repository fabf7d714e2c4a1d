import { useEffect, useRef, useState } from 'react'
import { nextId } from '@shared/survey/next-id'
import type { UnsentPhoto } from '@/features/survey-editor/chrome/unsent-photos'
import { addPhoto } from '@/features/surveys/api/add-photo'
import { messageOf } from '@/lib/api-error'
import type { SurveySession } from '../survey-session'

interface Waiting extends UnsentPhoto {
  file: File
}

/** Stores photos and makes them part of the survey; one that could not be sent is kept until it is, or is removed. */
export function useAddPhoto({ editor, record, addPhotoRecord }: SurveySession) {
  const [progress, setProgress] = useState<number | null>(null)
  const [unsent, setUnsent] = useState<readonly Waiting[]>([])
  const made = useRef(0)
  useWarnWhile(unsent.length > 0)
  const send = async (file: File, id: number) => {
    setProgress(0)
    setUnsent((known) => known.filter((each) => each.id !== id))
    try {
      const photo = await addPhoto(record.id, file, setProgress)
      const taken = editor.getSnapshot().survey.photos.map(({ id: known }) => known)
      const name = taken.includes(photo.surveyPhotoId) ? nextId(taken, 'F') : photo.surveyPhotoId
      addPhotoRecord(photo)
      editor.perform({ type: 'photo.add', photo: { id: name, file: photo.name, posts: {} } })
      editor.choosePhoto(name)
      editor.chooseTool('post')
    } catch (error) {
      setUnsent((known) => [...known, { id, file, name: file.name, fault: messageOf(error) }])
    } finally {
      setProgress(null)
    }
  }
  return {
    progress,
    unsent,
    store: (file: File) => void send(file, (made.current += 1)),
    sendAgain: (id: number) => {
      const waiting = unsent.find((each) => each.id === id)
      if (waiting) void send(waiting.file, id)
    },
    giveUp: (id: number) => setUnsent((known) => known.filter((each) => each.id !== id)),
  }
}

/** The browser asks before it closes a tab that still holds a photo. */
function useWarnWhile(waiting: boolean): void {
  useEffect(() => {
    if (!waiting) return
    const warn = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', warn)
    return () => window.removeEventListener('beforeunload', warn)
  }, [waiting])
}
