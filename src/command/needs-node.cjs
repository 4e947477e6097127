// Loaded before anything else, in whatever Node is there: written so that a very old one reads it too.
'use strict'

/** The oldest Node that every package of the project runs on. */
var needed = { major: 20, minor: 19 }

/**
 * Says in one sentence what is wrong with a version of Node, as `process.versions.node` gives it;
 * null where it will do.
 *
 * @param {string} version
 * @returns {string | null}
 */
function problemWithNode(version) {
  var parts = version.split('.')
  var major = Number(parts[0])
  var minor = Number(parts[1])
  if (major > needed.major || (major === needed.major && minor >= needed.minor)) return null
  return [
    `Phasogon needs Node ${needed.major}.${needed.minor} or newer,`,
    `and this is Node ${version}:`,
    'install a newer one from https://nodejs.org and run the command again.',
  ].join(' ')
}

module.exports = { problemWithNode: problemWithNode }

var problem = problemWithNode(process.versions.node)
if (problem !== null) {
  console.error(problem)
  process.exit(1)
}
