/** The longest file that is read, in bytes of UTF-8: 5 MB. */
export const MAXIMUM_FILE_BYTES = 5_000_000

/** The longest link that is read, in characters: 64 kB. */
export const MAXIMUM_LINK_LENGTH = 65_536

/** The most that a link may inflate to, in bytes: 1 MB. */
export const MAXIMUM_INFLATED_BYTES = 1_000_000

/** The most phasors on a sheet. */
export const MAXIMUM_PHASORS = 2_000

/** The most entries in any other list of a sheet. */
export const MAXIMUM_ENTRIES = 10_000

/** The most levels of lists and objects inside each other. */
export const MAXIMUM_DEPTH = 64

/** The most errors that are reported for one sheet. */
export const MAXIMUM_ERRORS = 100
