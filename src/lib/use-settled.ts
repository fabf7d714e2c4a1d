import { useEffect, useState } from 'react'

/** A value once it has stayed the same for a moment: words are looked for when typing pauses, not at every letter. */
export function useSettled<Value>(value: Value, milliseconds = 250): Value {
  const [settled, setSettled] = useState(value)
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), milliseconds)
    return () => clearTimeout(timer)
  }, [value, milliseconds])
  return settled
}
