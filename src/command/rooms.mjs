import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { cruise } from 'dependency-cruiser'
import { roomRules } from './room-rules.mjs'
import { projectFolder } from './run.mjs'

/** What is looked at, as far as it exists. */
const looked = ['src', 'test', 'e2e', 'vite.config.ts', '.config']

/**
 * Follows every import of the project and holds it against the rules of the rooms. It throws where
 * it could read no module at all, since that is no proof of anything.
 *
 * @param {string} [folder] the project's folder
 * @returns {Promise<{ modules: number, breaches: string[] }>} how many of our own files were read,
 *   and a line for each import that breaks a rule
 */
export async function checkRooms(folder = projectFolder) {
  const { output } = await cruise(
    looked.filter((name) => existsSync(join(folder, name))),
    {
      baseDir: folder,
      validate: true,
      ruleSet: { forbidden: roomRules },
      doNotFollow: { path: '^node_modules/' },
      exclude: { path: '^(dist|test-results)/|^test/.*/fixtures/' },
      tsPreCompilationDeps: true,
    },
    { exportsFields: ['exports'], conditionNames: ['import', 'types', 'default'] },
  )
  if (typeof output === 'string') throw new Error('The imports came back as text.')
  const own = output.modules.filter((module) => /^(src|test|e2e)\//.test(module.source))
  if (own.length === 0) throw new Error('Not one module was read: the borders are not checked.')
  const breaches = output.summary.violations.map(
    ({ rule, from, to }) => `${rule.name}: ${from === to ? from : `${from} → ${to}`}`,
  )
  return { modules: own.length, breaches }
}
