import { checkPackages } from './packages.mjs'

// Prints what is wrong with the list of packages; fails where anything is.
const problems = checkPackages()
for (const problem of problems) console.error(problem)
console.log(problems.length === 0 ? 'Every package is used, at one exact version.' : '')
process.exitCode = problems.length === 0 ? 0 : 1
