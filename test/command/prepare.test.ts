import { describe, expect, test } from 'vitest'
import { isInstalled } from '../../src/command/prepare.mjs'

const wanted = {
  packages: {
    '': { version: '0.1.0' },
    'node_modules/a': { version: '1.0.0', integrity: 'sha512-a' },
    'node_modules/b': { version: '2.0.0', integrity: 'sha512-b', optional: true },
  },
}
const a = { version: '1.0.0', integrity: 'sha512-a' }

describe('what is installed', () => {
  test('nothing installed is not enough', () => {
    expect(isInstalled(wanted, undefined)).toBe(false)
    expect(isInstalled(wanted, {})).toBe(false)
    expect(isInstalled(wanted, { packages: {} })).toBe(false)
  })

  test('every package at its version is enough, without the optional ones of other systems', () => {
    expect(isInstalled(wanted, { packages: { 'node_modules/a': a } })).toBe(true)
  })

  test('another version, another content or a package too many is not', () => {
    const other = { ...a, version: '1.0.1' }
    const altered = { ...a, integrity: 'sha512-z' }
    expect(isInstalled(wanted, { packages: { 'node_modules/a': other } })).toBe(false)
    expect(isInstalled(wanted, { packages: { 'node_modules/a': altered } })).toBe(false)
    expect(isInstalled(wanted, { packages: { 'node_modules/a': a, 'node_modules/c': a } })).toBe(
      false,
    )
  })
})
