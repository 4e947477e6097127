import { createStore as createZustandStore, type StoreApi } from 'zustand/vanilla'
import {
  apply,
  commit,
  createHistory,
  describeEdit,
  type Edit,
  redo,
  type Sheet,
  undo,
} from '../../sheet'
import { describeAnswer } from './describe'
import { answerOf, hasPhasor, hasSum } from './selectors'
import type { Notice, Origin, Selection, State } from './state'

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
  /** Opens another sheet; the one that was open stays on the shelf. */
  open(sheet: Sheet, origin: Origin, text?: string): void
  /** Goes back to the sheet that was open before. */
  goBack(): void
  notify(notice: Notice | undefined): void
}

/** The page's store: the state and what can be done to it. */
export type Store = StoreApi<State & Actions>

/** Makes the store with a sheet open in it. It knows nothing of the browser. */
export function createStore(sheet: Sheet, origin: Origin): Store {
  return createZustandStore<State & Actions>()((set, get) => {
    const settle = (history: State['history'], said: string, notice?: Notice) => {
      const { selection, chosenSum } = get()
      set({
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
      const description = describeEdit(history.sheet, edit)
      const said = `${description}.`
      settle(commit(history, result.value, description), said, removalNotice(edit, said))
      return true
    }

    return {
      history: createHistory(sheet),
      shelf: [],
      origin,
      draft: undefined,
      selection: undefined,
      chosenSum: undefined,
      notice: undefined,
      announcement: '',

      edit: step,
      preview: (edit) => {
        const result = apply(get().history.sheet, edit)
        if (result.ok) set({ draft: { edit, sheet: result.value } })
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
      open: (opened, from, text) => {
        const { history, shelf, origin: before } = get()
        set({
          shelf: [...shelf, { history, origin: before }],
          origin: from,
          selection: undefined,
          chosenSum: undefined,
        })
        const said = text ?? `Opened “${opened.title || 'Untitled sheet'}”.`
        settle(createHistory(opened), said, { tone: 'news', text: said, offer: 'go-back' })
      },
      goBack: () => {
        const { shelf } = get()
        const last = shelf.at(-1)
        if (!last) return
        set({ shelf: shelf.slice(0, -1), origin: last.origin })
        settle(last.history, `Back to “${last.history.sheet.title || 'Untitled sheet'}”.`)
      },
      notify: (notice) => set({ notice }),
    }
  })
}

function keptSelection(sheet: Sheet, selection: Selection | undefined): Selection | undefined {
  if (!selection) return undefined
  const kept =
    selection.kind === 'phasor' ? hasPhasor(sheet, selection.id) : hasSum(sheet, selection.id)
  return kept ? selection : undefined
}

function removalNotice(edit: Edit, said: string): Notice | undefined {
  return edit.kind.startsWith('remove-') ? { tone: 'news', text: said, offer: 'undo' } : undefined
}
