import { readdir, readFile } from 'node:fs/promises'
import { join } from 'node:path'
import { expect, test } from '@playwright/test'
import { projectFolder } from '../src/command/run.mjs'

const folder = join(projectFolder, 'dist')

/** The scripts that the page fetches before it is drawn: those it names, and what these import at once. */
async function firstScripts(): Promise<ReadonlySet<string>> {
  const page = await readFile(join(folder, 'index.html'), 'utf8')
  const left = [...page.matchAll(/(?:src|href)="\.\/(assets\/[^"]+\.js)"/g)].map(([, name]) => name)
  const found = new Set<string>()
  for (let name = left.pop(); name !== undefined; name = left.pop()) {
    if (found.has(name)) continue
    found.add(name)
    const text = await readFile(join(folder, name), 'utf8')
    const imports = text.matchAll(/(?:\bfrom|\bimport)\s*["']\.\/([^"']+\.js)["']/g)
    for (const [, other] of imports) left.push(`assets/${other}`)
  }
  return found
}

test('the PDF, its typefaces and the report are no part of the first load', async () => {
  const names = (await readdir(join(folder, 'assets'))).filter((name) => name.endsWith('.js'))
  const texts = new Map(
    await Promise.all(
      names.map(
        async (name) =>
          [`assets/${name}`, await readFile(join(folder, 'assets', name), 'utf8')] as const,
      ),
    ),
  )
  const first = await firstScripts()
  expect(first.size).toBeGreaterThan(1)
  // Sentences that no shortening of names touches: the library's, and one of the report's own.
  for (const sentence of ['/FontDescriptor', 'Drawn values are read off the paper']) {
    const holders = [...texts].filter(([, text]) => text.includes(sentence)).map(([name]) => name)
    expect(holders).toHaveLength(1)
    expect(first.has(holders[0] ?? '')).toBe(false)
    expect(await readFile(join(folder, 'service-worker.js'), 'utf8')).toContain(holders[0])
  }
  const whole = [...texts.values()].join('')
  for (const mark of ['data-html2canvas-ignore', 'ALLOWED_URI_REGEXP', 'RGBColor']) {
    expect([mark, whole.includes(mark)]).toEqual([mark, false])
  }
})

test('the typefaces of the PDF are kept for use without a network, and named by no style', async () => {
  const worker = await readFile(join(folder, 'service-worker.js'), 'utf8')
  const styles = (await readdir(join(folder, 'assets'))).filter((name) => name.endsWith('.css'))
  const texts = await Promise.all(
    styles.map((name) => readFile(join(folder, 'assets', name), 'utf8')),
  )
  const page = await readFile(join(folder, 'index.html'), 'utf8')
  for (const face of ['sans', 'bold', 'symbol']) {
    expect(worker).toContain(`fonts/phasogon-print-${face}.ttf`)
    expect([page, ...texts].join('')).not.toContain(`phasogon-print-${face}`)
  }
})
