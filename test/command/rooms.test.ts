import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { dirname, join } from 'node:path'
import { afterEach, describe, expect, test } from 'vitest'
import { checkRooms } from '../../src/command/rooms.mjs'

const made: string[] = []
afterEach(() => {
  for (const folder of made.splice(0)) rmSync(folder, { recursive: true })
})

/** A small house in a folder of its own, with these files besides one that is in order. */
function house(files: Record<string, string>): string {
  const folder = mkdtempSync(join(tmpdir(), 'phasogon-rooms-'))
  made.push(folder)
  const all = {
    'src/core/angle.ts': 'export const turn = 360\n',
    'src/core/index.ts': "export { turn } from './angle'\n",
    'src/sheet/index.ts': "import { turn } from '../core'\nexport const half = turn / 2\n",
    'src/app/main.tsx': "import { half } from '../sheet'\nconsole.log(half)\n",
    ...files,
  }
  for (const [name, text] of Object.entries(all)) {
    mkdirSync(dirname(join(folder, name)), { recursive: true })
    writeFileSync(join(folder, name), text)
  }
  return folder
}

describe('the borders of the rooms', () => {
  test('are checked on more than no module, and hold', async () => {
    const { modules, breaches } = await checkRooms()
    expect(modules).toBeGreaterThan(20)
    expect(breaches).toEqual([])
  })

  test('a house without a module is no proof', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'phasogon-rooms-'))
    made.push(folder)
    mkdirSync(join(folder, 'src'))
    await expect(checkRooms(folder)).rejects.toThrow('Not one module was read')
  })

  test('a house in order has no breach', async () => {
    expect(await checkRooms(house({}))).toEqual({ modules: 4, breaches: [] })
  })

  test.each([
    [
      'the arithmetic knows no sheet',
      {
        'src/core/angle.ts':
          "import type { half } from '../sheet'\nexport type Turn = typeof half\nexport const turn = 360\n",
      },
      'what-core-may-import: src/core/angle.ts → src/sheet/index.ts',
    ],
    [
      'the arithmetic knows no Node',
      { 'src/core/angle.ts': "import { EOL } from 'node:os'\nexport const turn = EOL.length\n" },
      'what-core-may-import: src/core/angle.ts → os',
    ],
    [
      'the page knows no Node',
      {
        'src/app/main.tsx':
          "import { EOL } from 'node:os'\nimport { half } from '../sheet'\nconsole.log(EOL, half)\n",
      },
      'no-node-in-the-page: src/app/main.tsx → os',
    ],
    [
      'a room is entered by its door',
      {
        'src/app/main.tsx':
          "import { turn } from '../core/angle'\nimport { half } from '../sheet'\nconsole.log(turn, half)\n",
      },
      'through-the-door: src/app/main.tsx → src/core/angle.ts',
    ],
    [
      'a circle is found',
      {
        'src/core/angle.ts': "import { two } from './two'\nexport const turn = 180 * two\n",
        'src/core/two.ts': "import { turn } from './angle'\nexport const two = turn > 0 ? 2 : 3\n",
      },
      'no-circle: src/core/angle.ts → src/core/two.ts',
    ],
    [
      'a file that the program never gets to is found',
      { 'src/core/lost.ts': "import { turn } from './angle'\nexport const lost = turn\n" },
      'nothing-left-over: src/core/lost.ts',
    ],
    [
      'a file that stands alone is found',
      { 'test/alone.ts': 'export const alone = 1\n' },
      'nothing-alone: test/alone.ts',
    ],
    [
      'an import of nothing is found',
      {
        'src/app/main.tsx': "import { half } from '../sheet'\nimport './gone'\nconsole.log(half)\n",
      },
      'nothing-missing: src/app/main.tsx → ./gone',
    ],
  ])('%s', async (_, files, breach) => {
    expect((await checkRooms(house(files))).breaches).toContain(breach)
  })
})
