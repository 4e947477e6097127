import { preparePackages } from './prepare.mjs'
import { commandFile, run } from './run.mjs'

// `npm start`: installs what is missing, builds the page, serves it and prints its address.
const isReady =
  (await preparePackages()) &&
  (await run(process.execPath, [commandFile('vite', 'vite'), 'build'])) === 0
if (isReady) await import('./serve.mjs')
else process.exitCode = 1
