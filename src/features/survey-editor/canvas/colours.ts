/** Colours of the drawing, taken from the style sheet's tokens, so that none is written here. */
export interface DrawingColours {
  core: string
  halo: string
  chalk: string
  marker: string
  stop: string
  steel: string
  paper: string
}

const tokens: Record<keyof DrawingColours, string> = {
  core: '--mark-core',
  halo: '--mark-halo',
  chalk: '--mark-chalk',
  marker: '--mark-marker',
  stop: '--mark-stop',
  steel: '--steel',
  paper: '--paper',
}

/** Reads the tokens as colours a canvas understands. */
export function readColours(near: HTMLElement): DrawingColours {
  const probe = document.createElement('span')
  near.append(probe)
  const colour = (token: string): string => {
    probe.style.color = `var(${token})`
    return getComputedStyle(probe).color
  }
  const colours = Object.fromEntries(
    Object.entries(tokens).map(([name, token]) => [name, colour(token)]),
  ) as unknown as DrawingColours
  probe.remove()
  return colours
}
