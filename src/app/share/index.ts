export { ShareMenu } from './ShareMenu'
export { linkTo, warnedLength } from './system-share'
