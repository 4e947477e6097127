/**
 * `npm run --silent evaluate -- FILE…` prints what the program says of sheets: one JSON object a line,
 * in the order of the files. Relative paths are those of the folder in which the command was given.
 * The exit status is 2 where a sheet is not valid or a file cannot be read, else 0.
 */
import { once } from 'node:events'
import { resolve } from 'node:path'
import { evaluateFile } from './evaluate-file'

const files = process.argv.slice(2)
// npm changes to the folder of the project and keeps the caller's here.
const folder = process.env.INIT_CWD ?? process.cwd()

// Whoever was reading has gone, as `head` does: nobody is left to tell.
process.stdout.on('error', () => process.exit(2))

if (files.length === 0) {
  console.error('Name the files to evaluate: npm run --silent evaluate -- FILE…')
  process.exitCode = 2
}

for (const file of files) {
  for await (const answer of evaluateFile(file, resolve(folder, file))) {
    if ('errors' in answer) process.exitCode = 2
    if (!process.stdout.write(`${JSON.stringify(answer)}\n`)) await once(process.stdout, 'drain')
  }
}
