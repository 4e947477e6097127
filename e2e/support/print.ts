import { getDocumentProxy, getResolvedPDFJS } from 'unpdf'

/** A straight line on a page, in millimetres from its lower left corner. */
export interface PrintedLine {
  readonly from: readonly [number, number]
  readonly to: readonly [number, number]
}

/** A page as a reader of PDF sees it. */
export interface PrintedPage {
  /** Millimetres. */
  readonly width: number
  readonly height: number
  readonly text: string
  readonly lines: readonly PrintedLine[]
}

// The reader wants more of the runtime than the oldest one that is supported has: a copy does as well.
if (!('transferToFixedLength' in ArrayBuffer.prototype)) {
  Object.defineProperty(ArrayBuffer.prototype, 'transferToFixedLength', {
    value(this: ArrayBuffer, length?: number) {
      return this.slice(0, length)
    },
  })
}

const millimetresPerPoint = 25.4 / 72

type Matrix = readonly [number, number, number, number, number, number]

/** Reads the pages of a PDF with a reader of its own, which knows nothing of who wrote it. */
export async function readPrint(bytes: Uint8Array): Promise<readonly PrintedPage[]> {
  const document = await getDocumentProxy(new Uint8Array(bytes))
  const pages: PrintedPage[] = []
  for (let number = 1; number <= document.numPages; number += 1) {
    const page = await document.getPage(number)
    const [left = 0, bottom = 0, right = 0, top = 0] = page.view
    const { items } = await page.getTextContent()
    pages.push({
      width: (right - left) * millimetresPerPoint,
      height: (top - bottom) * millimetresPerPoint,
      text: items.map((item) => ('str' in item ? item.str : '')).join(' '),
      lines: await linesIn(await page.getOperatorList()),
    })
  }
  return pages
}

/** The length of a line in millimetres. */
export function lengthOf({ from, to }: PrintedLine): number {
  return Math.hypot(to[0] - from[0], to[1] - from[1])
}

/** The straight lines that a page strokes, wherever its coordinates were moved, turned and scaled to. */
async function linesIn(operators: {
  readonly fnArray: readonly number[]
  readonly argsArray: readonly unknown[]
}): Promise<readonly PrintedLine[]> {
  const { OPS } = await getResolvedPDFJS()
  const lines: PrintedLine[] = []
  const kept: Matrix[] = []
  let matrix: Matrix = [1, 0, 0, 1, 0, 0]
  operators.fnArray.forEach((operator, at) => {
    const given = operators.argsArray[at]
    if (operator === OPS.save) kept.push(matrix)
    else if (operator === OPS.restore) matrix = kept.pop() ?? matrix
    else if (operator === OPS.transform) matrix = product(matrix, given as Matrix)
    else if (operator === OPS.constructPath) lines.push(...linesOfPath(matrix, given))
  })
  return lines
}

/** The steps of a path: move, line, curve, curve with one handle, close. */
const STEPS = [2, 2, 6, 4, 0]

function linesOfPath(matrix: Matrix, given: unknown): readonly PrintedLine[] {
  const [, [path]] = given as [number, [ArrayLike<number> | null]]
  const lines: PrintedLine[] = []
  let last: readonly [number, number] = [0, 0]
  for (let at = 0; path && at < path.length; ) {
    const step = path[at] ?? 0
    const length = STEPS[step] ?? 0
    const end = at + length
    if (length > 0) {
      const here = placed(matrix, path[end - 1] ?? 0, path[end] ?? 0)
      if (step === 1) lines.push({ from: last, to: here })
      last = here
    }
    at = end + 1
  }
  return lines
}

function placed([a, b, c, d, e, f]: Matrix, x: number, y: number): readonly [number, number] {
  return [(a * x + c * y + e) * millimetresPerPoint, (b * x + d * y + f) * millimetresPerPoint]
}

/** First the second, then the first: as each transform of a page comes before those around it. */
function product([a, b, c, d, e, f]: Matrix, [g, h, i, j, k, l]: Matrix): Matrix {
  return [
    a * g + c * h,
    b * g + d * h,
    a * i + c * j,
    b * i + d * j,
    a * k + c * l + e,
    b * k + d * l + f,
  ]
}
