export { type AddressBar, browserAddress, keepAddress } from './address'
export { acceptDrops } from './drop'
export { LinkVerbs } from './LinkVerbs'
export { openFile, openLink } from './open'
