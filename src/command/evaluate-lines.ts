import { createReadStream } from 'node:fs'
import { MAXIMUM_FILE_BYTES } from '../sheet'

/**
 * The lines of a text file, without their ends, whatever its size. Of a line that is too long for a
 * sheet no more is kept than shows that.
 */
export async function* linesOf(path: string): AsyncGenerator<string> {
  let rest = ''
  for await (const chunk of createReadStream(path, { encoding: 'utf8' })) {
    const lines = `${rest}${chunk}`.split(/\r?\n/)
    rest = (lines.pop() ?? '').slice(0, MAXIMUM_FILE_BYTES + 1)
    yield* lines
  }
  yield rest
}
