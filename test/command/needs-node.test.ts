import { spawnSync } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { resolve } from 'node:path'
import { describe, expect, test } from 'vitest'
import { problemWithNode } from '../../src/command/needs-node.cjs'

const file = resolve('src/command/needs-node.cjs')

describe('the version of Node', () => {
  test('an older Node is told which one is needed', () => {
    for (const version of ['0.10.48', '8.17.0', '18.20.4', '20.18.3']) {
      expect(problemWithNode(version)).toBe(
        `Phasogon needs Node 20.19 or newer, and this is Node ${version}: ` +
          'install a newer one from https://nodejs.org and run the command again.',
      )
    }
  })

  test('a Node that is new enough passes, also with two figures in its minor version', () => {
    for (const version of ['20.19.0', '20.20.2', '21.0.0', '22.1.0', '100.0.0']) {
      expect(problemWithNode(version)).toBeNull()
    }
  })

  test('an older Node runs nothing else', () => {
    const pretend = "Object.defineProperty(process, 'versions', { value: { node: '18.20.4' } });"
    const run = spawnSync(
      process.execPath,
      ['-e', `${pretend} require(${JSON.stringify(file)}); console.log('went on')`],
      { encoding: 'utf8' },
    )
    expect(run.status).toBe(1)
    expect(run.stdout).toBe('')
    expect(run.stderr).toContain('Phasogon needs Node 20.19 or newer, and this is Node 18.20.4')
  })

  test('both commands of the README ask first, and package.json names the same version', () => {
    const manifest = JSON.parse(readFileSync('package.json', 'utf8'))
    for (const script of ['start', 'test']) {
      expect(manifest.scripts[script]).toMatch(/^node -r \.\/src\/command\/needs-node\.cjs /)
    }
    expect(manifest.engines.node).toBe('>=20.19')
    expect(problemWithNode('20.19')).toBeNull()
  })

  test('the file that asks is written for a Node of long ago', () => {
    const text = readFileSync(file, 'utf8')
    expect(text).not.toMatch(/\b(import|await|async|class|const|let)\b\s|=>|\?\.|\?\?/)
  })
})
