/** Makes the data folder if need be and checks that it can be used. @throws Trouble */
export function openDataFolder(folder: string): void
/** The secret that signs session cookies: given, or made once and kept. */
export function sessionSecret(folder: string): string
/** Takes the folder for this process; returns how to let go of it. @throws Trouble when another start holds it. */
export function holdDataFolder(folder: string): () => void
