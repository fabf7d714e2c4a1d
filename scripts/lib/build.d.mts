/** When a file, or the newest thing in a folder, was last changed, in milliseconds; 0 for what is not there. */
export function newestChange(path: string): number
