/** Lets so many pieces of work run at once; the others wait their turn. Decoding a large photo takes much memory. */
export function takeTurns(atOnce: number): <Value>(work: () => Promise<Value>) => Promise<Value> {
  const waiting: (() => void)[] = []
  let running = 0
  return async (work) => {
    if (running >= atOnce) await new Promise<void>((go) => waiting.push(go))
    else running += 1
    try {
      return await work()
    } finally {
      const next = waiting.shift()
      if (next) next()
      else running -= 1
    }
  }
}
