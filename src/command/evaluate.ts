/**
 * `npm run --silent evaluate -- FILE…` prints what the program says of sheets: one JSON object a line,
 * in the order of the files; with `--table`, one CSV row a sheet below a row of names; with
 * `--fingerprint`, each object also has the fingerprint that is printed on the sheet's report. Relative
 * paths are those of the folder in which the command was given.
 * The exit status is 2 where a sheet is not valid or a file cannot be read, else 0.
 */
import { once } from 'node:events'
import { resolve } from 'node:path'
import { parseArgs } from 'node:util'
import { type Evaluated, evaluateFile } from './evaluate-file'
import { formatTableHead, formatTableRow } from './evaluate-table'

const { values, positionals: files } = parseArgs({
  allowPositionals: true,
  options: {
    table: { type: 'boolean', default: false },
    fingerprint: { type: 'boolean', default: false },
  },
})
// npm changes to the folder of the project and keeps the caller's here.
const folder = process.env.INIT_CWD ?? process.cwd()

// Whoever was reading has gone, as `head` does: nobody is left to tell.
process.stdout.on('error', () => process.exit(2))

if (files.length === 0) {
  console.error(
    'Name the files to evaluate: npm run --silent evaluate -- [--table | --fingerprint] FILE…',
  )
  process.exitCode = 2
}

if (values.table && files.length > 0) console.log(formatTableHead())

for (const file of files) {
  for await (const evaluated of evaluateFile(file, resolve(folder, file))) {
    if ('errors' in evaluated.answer) process.exitCode = 2
    const line = values.table ? formatTableRow(evaluated) : formatLine(evaluated)
    if (!process.stdout.write(`${line}\n`)) await once(process.stdout, 'drain')
  }
}

function formatLine({ answer, fingerprint }: Evaluated): string {
  return JSON.stringify(values.fingerprint ? { ...answer, fingerprint } : answer)
}
