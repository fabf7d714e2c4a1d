import { describe, expect, it } from 'vitest'
import { nextPhotoId } from '../../../../server/features/photos/next-photo-id'
import { photoName } from '../../../../server/features/photos/photo-name'
import { takeTurns } from '../../../../server/features/photos/take-turns'

describe('nextPhotoId', () => {
  it('is the first number not yet used', () => {
    expect(nextPhotoId([])).toBe('F1')
    expect(nextPhotoId(['F1', 'F3', 'deck'])).toBe('F2')
  })
})

describe('photoName', () => {
  it.each([
    ['IMG_0001.jpg', 'IMG_0001.jpg'],
    ['C:\\Users\\x\\deck.png', 'deck.png'],
    ['../../etc/passwd', 'passwd'],
    ['a\r\nb<c>.jpg', 'abc.jpg'],
    ['gpj.\u202eexe', 'gpj.exe'],
    ['..', 'photo.jpg'],
    ['', 'photo.jpg'],
  ])('%j becomes %j', (sent, name) => {
    expect(photoName(sent)).toBe(name)
  })

  it('stays short', () => {
    expect(photoName('x'.repeat(500))).toHaveLength(120)
  })
})

describe('takeTurns', () => {
  it('runs no more at once than it should, and all in the end, failures too', async () => {
    const inTurn = takeTurns(2)
    let running = 0
    let most = 0
    const work = (i: number) => async () => {
      running += 1
      most = Math.max(most, running)
      await new Promise((done) => setTimeout(done, 5))
      running -= 1
      if (i === 1) throw new Error('one fails')
      return i
    }
    const settled = await Promise.allSettled([0, 1, 2, 3, 4, 5].map((i) => inTurn(work(i))))
    expect(most).toBe(2)
    expect(settled.filter(({ status }) => status === 'fulfilled')).toHaveLength(5)
    expect(await inTurn(() => Promise.resolve('after'))).toBe('after')
  })
})
