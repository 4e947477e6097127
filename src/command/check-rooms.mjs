import { roomRules } from './room-rules.mjs'
import { checkRooms } from './rooms.mjs'

// Prints each import that breaks a rule of the rooms, with the reason; fails where there is one.
const { modules, breaches } = await checkRooms()
for (const breach of breaches) {
  const rule = roomRules.find(({ name }) => breach.startsWith(`${name}:`))
  console.error(`${breach}\n    ${rule?.comment ?? ''}`)
}
console.log(`${modules} modules read, ${breaches.length} imports that break a rule.`)
process.exitCode = breaches.length === 0 ? 0 : 1
