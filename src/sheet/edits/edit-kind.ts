import type { Result } from '../../core'
import type { Sheet } from '../types'

/** What one kind of edit does, and how it is called in a sentence. */
export interface EditKind<Edit> {
  /**
   * The sheet after the edit; the sheet that is given is never changed. A problem is one plain
   * sentence. What the result breaks elsewhere is found afterwards, by checking it as a whole.
   */
  readonly apply: (sheet: Sheet, edit: Edit) => Result<Sheet>
  /** A few words that fit after "Undo: ", with a capital and without a full stop. */
  readonly describe: (sheet: Sheet, edit: Edit) => string
  /**
   * Set where `apply` itself makes sure that the sheet stays valid, as an edit must that is drawn
   * anew in every frame of a drag: the check of the whole is then left out.
   */
  readonly isLight?: true
}
