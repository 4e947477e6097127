import { describe, expect, test } from 'vitest'
import { checkPackages, problemsWithPackages } from '../../src/command/packages.mjs'

const commandsOf = (name: string) => (name === 'a-tool' ? ['draw'] : [])

describe('the list of packages', () => {
  test('holds nothing that is not used', () => {
    expect(checkPackages()).toEqual([])
  })

  test('counts what is imported, what a script runs, and the types of what is listed', () => {
    const manifest = {
      scripts: { picture: 'draw --all' },
      dependencies: { plain: '1.0.0', '@scope/deep': '1.0.0', late: '1.0.0' },
      devDependencies: {
        'a-tool': '1.0.0',
        runner: '1.0.0',
        '@types/plain': '1.0.0',
        '@types/node': '1.0.0',
      },
    }
    const sources = [
      "import { a } from 'plain'",
      "export * from '@scope/deep/part'",
      "const b = await import('late')",
      "commandFile('runner', 'run')",
    ]
    expect(problemsWithPackages(manifest, sources, commandsOf)).toEqual([])
  })

  test('names what nothing uses: a like name, a comment or a string is no use', () => {
    const manifest = {
      dependencies: { plain: '1.0.0' },
      devDependencies: { '@types/gone': '1.0.0' },
    }
    const sources = ["import { a } from 'plain-other'", "const name = 'plain'", '// plain']
    expect(problemsWithPackages(manifest, sources, commandsOf)).toEqual([
      'Nothing uses plain: remove it from package.json.',
      'Nothing uses @types/gone: remove it from package.json.',
    ])
  })

  test('wants one exact version', () => {
    const manifest = { dependencies: { plain: '^1.0.0' } }
    expect(problemsWithPackages(manifest, ["import 'plain'"], commandsOf)).toEqual([
      'plain must have one exact version.',
    ])
  })
})
