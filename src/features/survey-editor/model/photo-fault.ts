/** As the server takes them. */
const LARGEST = 25 * 1024 * 1024

/** Why a file cannot be a photo of the survey, before any of it is sent; the server looks at the content itself. */
export function photoFault({
  name,
  type,
  size,
}: {
  name: string
  type: string
  size: number
}): string | undefined {
  if (/hei[cf]/i.test(type) || /\.hei[cf]$/i.test(name)) {
    return 'This photo is HEIC, which browsers cannot show. In the phone’s camera settings choose the most compatible format (JPEG) and take it again, or share it to this page as JPEG.'
  }
  if (size > LARGEST) {
    return `This photo has ${Math.ceil(size / 1024 / 1024)} MB; at most 25 MB can be stored. Take it at a smaller size.`
  }
  if (size === 0) return 'This file is empty. Choose the photo again.'
  if (type !== '' && !/^image\/(jpeg|png|webp)$/.test(type)) {
    return 'This file is no photo that can be stored. Choose a JPEG, PNG or WebP picture.'
  }
  return undefined
}
