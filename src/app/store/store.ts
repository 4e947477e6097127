import { createStore as createZustandStore, type StoreApi } from 'zustand/vanilla'
import {
  apply,
  commit,
  createHistory,
  describeEdit,
  type Edit,
  type Evaluation,
  redo,
  type Sheet,
  serializeSheet,
  undo,
  voidedBetween,
} from '../../sheet'
import { describeAnswer } from './describe'
import { createIdentity } from './identity'
import { answerOf, continueAnswer, hasHandArrow, hasPhasor, hasSum, keepAnswer } from './selectors'
import type { Identity, Notice, Origin, Pen, Progress, Selection, Shelved, State } from './state'

/** What can be done to the page's state. Each either does the whole thing or says why it does not. */
export interface Actions {
  /** Makes an edit one step of the history. False where it was refused; the notice then says why. */
  edit(edit: Edit): boolean
  /** Shows an edit without making it; a refused one leaves the last draft. */
  preview(edit: Edit): void
  /** Drops the draft without a trace. */
  dropDraft(): void
  undo(): void
  redo(): void
  select(selection: Selection | undefined): void
  chooseSum(id: string): void
  /** Changes how the board is drawn on. A pen that is taken up draws beside the readings as read. */
  setPen(change: Partial<Pen>): void
  /**
   * Opens another sheet; the one that was open stays on the shelf. Where the sheet of that identity
   * stands on the shelf just as it is, its history comes back with it.
   */
  open(sheet: Sheet, origin: Origin, text?: string, identity?: Identity): void
  /** Takes over what another tab made of a sheet, open or shelved, as one step of its history. */
  receive(id: string, sheet: Sheet): void
  /** Gives a sheet, open or shelved, another identity: it goes on as a sheet of its own. */
  identify(id: string, identity: Identity): void
  /** Goes back to the sheet that was open before. */
  goBack(): void
  notify(notice: Notice | undefined): void
  /** Takes the whole evaluation of a sheet, the open one or an older. */
  receiveAnswer(sheet: Sheet, evaluation: Evaluation): void
  /** Says how the whole answer for the open sheet comes along. */
  setProgress(progress: Progress): void
  /** Shows the board as read or as adjusted. The adjusted values are not drawn on: the pen is put down. */
  showValues(values: State['values']): void
}

/** The page's store: the state and what can be done to it. */
export type Store = StoreApi<State & Actions>

/** Makes the store with a sheet open in it. It knows nothing of the browser. */
export function createStore(
  sheet: Sheet,
  origin: Origin,
  identity: Identity = createIdentity(),
): Store {
  return createZustandStore<State & Actions>()((set, get) => {
    const settle = (
      history: State['history'],
      said: string,
      notice?: Notice,
      opening?: Pick<State, 'shelf' | 'origin' | 'identity'>,
    ) => {
      // What was picked on one sheet means nothing on another.
      const { selection, chosenSum } = opening ? {} : get()
      set({
        ...opening,
        history,
        draft: undefined,
        selection: keptSelection(history.sheet, selection),
        chosenSum:
          chosenSum !== undefined && hasSum(history.sheet, chosenSum) ? chosenSum : undefined,
        notice,
        announcement: `${said} ${describeAnswer(answerOf(history.sheet), chosenSum)}`,
      })
    }

    const step = (edit: Edit): boolean => {
      const { history } = get()
      const result = apply(history.sheet, edit)
      if (!result.ok) {
        set({ draft: undefined, notice: { tone: 'problem', text: result.problem } })
        return false
      }
      if (result.value === history.sheet) {
        set({ draft: undefined })
        return true
      }
      continueAnswer(history.sheet, result.value)
      const description = describeEdit(history.sheet, edit)
      const said = `${description}.`
      const voided = voidNotice(history.sheet, result.value)
      const told = voided ? `${said} ${voided.text}` : said
      settle(commit(history, result.value, description), told, voided ?? removalNotice(edit, said))
      return true
    }

    return {
      history: createHistory(sheet),
      shelf: [],
      origin,
      identity,
      draft: undefined,
      selection: undefined,
      chosenSum: undefined,
      pen: restingPen,
      notice: undefined,
      answer: undefined,
      progress: { state: 'resting' },
      values: 'read',
      announcement: '',

      edit: step,
      preview: (edit) => {
        const result = apply(get().history.sheet, edit)
        if (!result.ok) return
        continueAnswer(get().history.sheet, result.value)
        set({ draft: { edit, sheet: result.value } })
      },
      dropDraft: () => {
        if (get().draft) set({ draft: undefined })
      },
      undo: () => {
        const { history } = get()
        if (history.past.length > 0) settle(undo(history), 'Undone.')
      },
      redo: () => {
        const { history } = get()
        if (history.future.length > 0) settle(redo(history), 'Redone.')
      },
      select: (selection) => set({ selection }),
      chooseSum: (id) => set({ chosenSum: id }),
      setPen: (change) => {
        set(({ pen }) => ({ pen: { ...pen, ...change } }))
        if (change.mode === undefined || get().values === 'read') return
        set({ values: 'read', notice: { tone: 'news', text: DRAWN_AS_READ } })
      },
      open: (opened, from, text, known = createIdentity()) => {
        const { history, shelf, origin: before, identity: left } = get()
        const shelved = shelf.find(({ identity: { id } }) => id === known.id)
        const said = text ?? `Opened “${opened.title || 'Untitled sheet'}”.`
        settle(
          historyOf(opened, shelved),
          said,
          { tone: 'news', text: said, offer: 'go-back' },
          {
            shelf: [
              ...shelf.filter((each) => each !== shelved),
              { history, origin: before, identity: left },
            ],
            origin: from,
            identity: known,
          },
        )
      },
      receive: (id, received) => {
        const { history, identity: open, draft, notice } = get()
        const description = 'Change made in another tab'
        if (open.id !== id) {
          set(({ shelf }) => ({
            shelf: shelf.map((each) =>
              each.identity.id === id
                ? { ...each, history: commit(each.history, received, description) }
                : each,
            ),
          }))
          return
        }
        settle(commit(history, received, description), `${description}.`, notice)
        // A drag goes on, upon the sheet as it is now.
        if (draft) get().preview(draft.edit)
      },
      identify: (id, given) => {
        if (get().identity.id === id) set({ identity: given })
        else {
          set(({ shelf }) => ({
            shelf: shelf.map((each) =>
              each.identity.id === id ? { ...each, identity: given } : each,
            ),
          }))
        }
      },
      goBack: () => {
        const { shelf } = get()
        const last = shelf.at(-1)
        if (!last) return
        const { history, origin: before, identity: known } = last
        const said = `Back to “${history.sheet.title || 'Untitled sheet'}”.`
        settle(history, said, undefined, {
          shelf: shelf.slice(0, -1),
          origin: before,
          identity: known,
        })
      },
      notify: (notice) => set({ notice }),

      receiveAnswer: (sheet, evaluation) => set({ answer: keepAnswer(sheet, evaluation) }),
      setProgress: (progress) => set({ progress }),
      showValues: (values) => {
        const { mode } = get().pen
        set({ values })
        if (values === 'read' || mode === undefined) return
        get().setPen({ mode: undefined })
        set({ notice: { tone: 'news', text: PEN_IS_DOWN } })
      },
    }
  })
}

const DRAWN_AS_READ = 'The board draws the values as read again: a pen draws beside these.'
const PEN_IS_DOWN =
  'The pen is put down: the adjusted values are for looking only. Show the values as read to draw on.'

/** The pen as it lies: nothing is drawn. */
const restingPen: Pen = {
  mode: undefined,
  isAdjusting: false,
  isExactShown: false,
  construction: {},
  isConstructionSaved: false,
  areTerminalsShown: false,
  isPredictionHidden: false,
  areRegionsShown: false,
}

function historyOf(sheet: Sheet, shelved: Shelved | undefined): State['history'] {
  return shelved && serializeSheet(shelved.history.sheet) === serializeSheet(sheet)
    ? shelved.history
    : createHistory(sheet)
}

function keptSelection(sheet: Sheet, selection: Selection | undefined): Selection | undefined {
  if (!selection) return undefined
  const has = { phasor: hasPhasor, sum: hasSum, hand: hasHandArrow }[selection.kind]
  return has(sheet, selection.id) ? selection : undefined
}

/** Says that an edit voided signatures, since nobody who types a figure need have them in sight. */
function voidNotice(before: Sheet, after: Sheet): Notice | undefined {
  const voided = voidedBetween(before, after)
  if (voided.length === 0) return undefined
  const names = voided.map(({ kind, by }) => `${kind} by ${by}`).join(', ')
  const text = `The sheet was ${names}: that no longer holds, since it was changed. It is revision ${after.revision ?? '0'} now.`
  return { tone: 'news', text, offer: 'undo' }
}

function removalNotice(edit: Edit, said: string): Notice | undefined {
  return edit.kind.startsWith('remove-') ? { tone: 'news', text: said, offer: 'undo' } : undefined
}
