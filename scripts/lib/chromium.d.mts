/** The browser for the browser tests: the one named by `TAUTBOOK_CHROMIUM`, else Debian's. */
export function findChromium(): string | undefined
