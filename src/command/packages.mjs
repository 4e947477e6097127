import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { projectFolder } from './run.mjs'

/**
 * What is looked at of `package.json`.
 *
 * @typedef {object} Manifest
 * @property {Record<string, string>} [scripts]
 * @property {Record<string, string>} [dependencies]
 * @property {Record<string, string>} [devDependencies]
 */

/** An import, an export from elsewhere, or one of our own calls that runs an installed command. */
const namings =
  /\b(?:from|import|require|commandFile|installed)\b\s*\(?\s*['"]((?:@[\w.-]+\/)?[\w.-]+)[^'"]*['"]/g

/**
 * Says what is wrong with the list of packages: one that nothing imports and no script runs, or one
 * whose version is not exact. Types go with the package that they describe.
 *
 * @param {Manifest} manifest
 * @param {readonly string[]} sources the text of every file that may import a package
 * @param {(name: string) => readonly string[]} commandsOf the commands that a package brings
 * @returns {string[]} a sentence each
 */
export function problemsWithPackages(manifest, sources, commandsOf) {
  const listed = { ...manifest.dependencies, ...manifest.devDependencies }
  const named = new Set(
    sources.flatMap((text) => [...text.matchAll(namings)].map(([, name]) => name)),
  )
  const words = new Set(Object.values(manifest.scripts ?? {}).flatMap((line) => line.split(/\s+/)))
  /** @param {string} name */
  const isUsed = (name) =>
    named.has(name) ||
    commandsOf(name).some((command) => words.has(command)) ||
    name === '@types/node' ||
    (name.startsWith('@types/') && listed[name.slice('@types/'.length)] !== undefined)
  return Object.entries(listed).flatMap(([name, version]) => [
    ...(isUsed(name) ? [] : [`Nothing uses ${name}: remove it from package.json.`]),
    ...(/^\d+\.\d+\.\d+$/.test(version) ? [] : [`${name} must have one exact version.`]),
  ])
}

/** What `problemsWithPackages` says of this project. */
export function checkPackages() {
  /** @type {Manifest} */
  const manifest = readJson('package.json')
  const files = ['src', 'test', 'e2e', '.config'].flatMap(filesBelow)
  const sources = ['vite.config.ts', ...files.filter((file) => /\.(tsx?|[mc]js)$/.test(file))]
  return problemsWithPackages(
    manifest,
    sources.map((file) => readFileSync(join(projectFolder, file), 'utf8')),
    commandsOf,
  )
}

/**
 * A package with one command may leave out its name.
 *
 * @param {string} name
 */
function commandsOf(name) {
  const { bin } = readJson(`node_modules/${name}/package.json`)
  return typeof bin === 'string' ? [name] : Object.keys(bin ?? {})
}

/** @param {string} file */
function readJson(file) {
  return JSON.parse(readFileSync(join(projectFolder, file), 'utf8'))
}

/**
 * @param {string} folder
 * @returns {string[]}
 */
function filesBelow(folder) {
  return readdirSync(join(projectFolder, folder), { recursive: true }).map((name) =>
    join(folder, String(name)),
  )
}
