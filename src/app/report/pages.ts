import { constructionPages, type Page, type Paper, reportPages } from '../../drawing/report'
import { fingerprintOf, quick, type Sheet } from '../../sheet'
import { maybeQrCode } from '../share/qr-code'
import { linkTo } from '../share/system-share'
import type { Answer } from '../store'

/** What is printed. */
export type Kind = 'report' | 'construction'

/** What the user chose of a print. */
export interface Choice {
  readonly kind: Kind
  /** Of the pages beside the drawing; what is left out is that of the drawing. */
  readonly paper: Partial<Paper>
}

/** The pages of what was chosen. A verdict that is of an older sheet stands on none of them. */
export function pagesOf(answer: Answer, choice: Choice, terminals: boolean): readonly Page[] {
  const { sheet, whole } = answer
  const evaluation = whole ?? quick(sheet)
  const code = codeOf(sheet)
  const make = choice.kind === 'report' ? reportPages : constructionPages
  return make(sheet, evaluation, {
    paper: choice.paper,
    fingerprint: fingerprintOf(sheet),
    terminals,
    ...(code && { code }),
  })
}

const codes = new WeakMap<Sheet, ReturnType<typeof maybeQrCode>>()

/** The code of a sheet's link; undefined where it fits none. */
function codeOf(sheet: Sheet): ReturnType<typeof maybeQrCode> {
  if (!codes.has(sheet)) codes.set(sheet, maybeQrCode(linkTo(sheet)))
  return codes.get(sheet)
}
