const LONGEST = 120

/** The name a photo is shown under: the sender's, without folders and without what no name should hold. */
export function photoName(sent: string): string {
  const last = sent.split(/[\\/]/).at(-1) ?? ''
  // eslint-disable-next-line no-control-regex
  const clean = last.replace(/[\0-\x1f\x7f<>:"|?*\u202a-\u202e\u2066-\u2069]/g, '').trim()
  return clean === '' || clean === '.' || clean === '..' ? 'photo.jpg' : clean.slice(0, LONGEST)
}
