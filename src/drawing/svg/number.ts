/** `.001` … `.999`, without zeros at the end. */
const FRACTIONS = Array.from({ length: 1000 }, (_, thousandths) =>
  thousandths === 0 ? '' : `.${String(thousandths).padStart(3, '0')}`.replace(/0+$/, ''),
)
const LARGEST = 2 ** 31 / 1000 - 1

/** A number of millimetres to three decimals, without zeros at the end. */
export function formatMillimetres(value: number): string {
  // Printing whole numbers and looking the rest up is several times faster than printing doubles.
  if (!(value > -LARGEST && value < LARGEST)) return formatFar(value)
  const thousandths = Math.round(value * 1000)
  const size = thousandths < 0 ? -thousandths : thousandths
  const whole = (size / 1000) | 0
  const text = whole + (FRACTIONS[size - whole * 1000] as string)
  return thousandths < 0 ? `-${text}` : text
}

/** What no paper holds; never a word that a reader of numbers trips over. */
function formatFar(value: number): string {
  if (Number.isNaN(value)) return '0'
  return String(Math.min(1e9, Math.max(-1e9, Math.round(value))))
}
