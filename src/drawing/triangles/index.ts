export { triangleScene } from './scene'
export { type TriangleKind, type TriangleSubject, triangleSubjects } from './subjects'
