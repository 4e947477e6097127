import type { ConstructionLines, DrawingMode } from '../../drawing'
import type { Edit, Evaluation, History, Id, Sheet } from '../../sheet'

/** What is picked on the board and in the schedule. */
export type Selection =
  | { readonly kind: 'phasor'; readonly id: Id }
  | { readonly kind: 'sum'; readonly id: Id }
  | { readonly kind: 'hand'; readonly id: Id }

/** One sentence to the user. A problem stays until it is put away; news gives way to the next. */
export interface Notice {
  readonly tone: 'news' | 'problem'
  readonly text: string
  /** A verb that the notice offers. */
  readonly offer?: 'undo' | 'go-back'
  /** Other verbs that go with it. */
  readonly verbs?: readonly { readonly verb: string; readonly act: () => void }[]
}

/** An edit that is being tried, with the sheet as it would be. A drag is a draft until it is let go. */
export interface Draft {
  readonly edit: Edit
  readonly sheet: Sheet
}

/** Where the open sheet came from: it settles what the first visit says and what the address shows. */
export type Origin = 'example' | 'new' | 'link' | 'file' | 'kept'

/** Of what a sheet is a copy: someone's, that came by a link, or one that two tabs changed at once. */
export interface Copy {
  /** The title that it bears. */
  readonly of: string
  readonly why: 'link' | 'tabs'
}

/** Which sheet is open. It stands beside the document, so that no link or file carries it. */
export interface Identity {
  readonly id: string
  readonly copy?: Copy
}

/** A sheet that was open before, as it was left. */
export interface Shelved {
  readonly history: History
  readonly origin: Origin
  readonly identity: Identity
}

/** How the board is drawn on. It stands beside the document: no link or file carries it. */
export interface Pen {
  /** What a press on the paper draws; undefined: it takes hold of what is there. */
  readonly mode: DrawingMode | undefined
  /** While a construction is drawn: a press takes hold of the hand arrows instead of drawing another. */
  readonly isAdjusting: boolean
  /** The exact drawing was asked for before the construction is finished. */
  readonly isExactShown: boolean
  readonly construction: ConstructionLines
  /** The construction lines stand in what is saved, too. */
  readonly isConstructionSaved: boolean
  /** The terminals of each phasor stand in its subscript: its positive direction, from first to last. */
  readonly areTerminalsShown: boolean
  /** What the circuit predicts is not drawn. */
  readonly isPredictionHidden: boolean
  /** The 95 % regions of the best values are drawn at the tips. */
  readonly areRegionsShown: boolean
}

/** All that the page remembers. What can be derived from it is derived: see the selectors. */
export interface State {
  readonly history: History
  /** Histories of sheets that were open before this one, newest last. */
  readonly shelf: readonly Shelved[]
  readonly origin: Origin
  readonly identity: Identity
  readonly draft: Draft | undefined
  readonly selection: Selection | undefined
  /** The sum in the check line; the first where none was chosen. */
  readonly chosenSum: Id | undefined
  readonly pen: Pen
  readonly notice: Notice | undefined
  /** The last whole answer that came. It is of an older sheet while `progress` says so. */
  readonly answer: Answer | undefined
  readonly progress: Progress
  /** Whether the board shows the readings as read, or the best values, which close. */
  readonly values: 'read' | 'adjusted'
  /** What a screen reader is told after an edit. */
  readonly announcement: string
}

/** A sheet with what the program says of it. */
export interface Answer {
  readonly sheet: Sheet
  /** What the page shows: values as read, what is solved filled in once that is known. */
  readonly evaluation: Evaluation
  /** Everything solved and adjusted; undefined until it is worked out. */
  readonly whole?: Evaluation
  /** Until then: that of the sheet before, shown greyed. */
  readonly former?: Evaluation
}

/** How the whole answer comes along. */
export type Progress =
  | { readonly state: 'resting' | 'working' | 'slow' }
  | { readonly state: 'failed'; readonly text: string }
