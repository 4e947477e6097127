import type { Locator, Page } from '@playwright/test'
import type { CircuitElement, Form, Reading, Sheet } from '../../src/sheet'
import { nextReading } from './readings'
import { sheetOf } from './sheets'
import { expect } from './test'

/** The part of the page that is about the circuit. */
export function circuitOf(page: Page): Locator {
  return page.getByRole('region', { name: 'Circuit' })
}

/** Adds an element; the cell of its first value then has the focus. */
export async function addElement(
  page: Page,
  kind: CircuitElement['kind'],
  form: Form,
  to: string,
): Promise<void> {
  const circuit = circuitOf(page)
  await circuit.getByRole('combobox', { name: 'What to add' }).selectOption(kind)
  await circuit.getByRole('combobox', { name: 'How it is joined' }).selectOption(form)
  await circuit.getByRole('combobox', { name: 'With what' }).selectOption({ label: to })
  await circuit.getByRole('button', { name: 'Add element' }).click()
}

/** Types into a field or cell of the circuit, over what stood there. */
export async function typeInCircuit(page: Page, name: string, text: string): Promise<void> {
  const field = circuitOf(page).getByRole('textbox', { name, exact: true })
  await field.fill(text)
  await field.press('Enter')
}

/** Types what the displays show, one reading after the other. */
export async function readOff(
  page: Page,
  shown: readonly (readonly [string, Reading['kind'], string])[],
): Promise<void> {
  for (const [label, kind, text] of shown) {
    await page.getByRole('combobox', { name: 'Phasor of the next reading' }).selectOption({ label })
    await page.getByRole('combobox', { name: 'Kind of the next reading' }).selectOption(kind)
    await nextReading(page).fill(text)
    await nextReading(page).press('Enter')
    await expect(nextReading(page)).toHaveValue('')
  }
}

/** A row of the comparison, by the label of its phasor. */
export function comparedRow(page: Page, label: string): Locator {
  return circuitOf(page)
    .getByRole('row')
    .filter({ has: page.getByRole('rowheader', { name: label, exact: true }) })
}

/**
 * An invented job: the start capacitor of a conveyor's brake, in series with its coil and a resistor for
 * measuring, on 230 V.
 */
export function brakeSheet(readings: readonly Reading[] = []): Sheet {
  return sheetOf({
    title: 'Conveyor 3, brake',
    frequency: { value: 50, text: '50' },
    supply: 'VS',
    reference: 'VS',
    phasors: [
      { id: 'VS', label: 'VS', quantity: 'voltage', magnitude: { value: 230, text: '230' } },
      { id: 'I', label: 'I', quantity: 'current' },
      { id: 'VR', label: 'VR', quantity: 'voltage' },
      { id: 'Vcoil', label: 'Vcoil', quantity: 'voltage' },
      { id: 'VC', label: 'VC', quantity: 'voltage' },
    ],
    sums: [
      {
        id: 's1',
        terms: [{ phasor: 'VR' }, { phasor: 'Vcoil' }, { phasor: 'VC' }],
        equals: 'VS',
      },
    ],
    elements: [
      {
        id: 'R',
        kind: 'resistor',
        voltage: 'VR',
        current: 'I',
        marked: { resistance: { value: 47, text: '47', limit: 0.47 } },
      },
      {
        id: 'coil',
        kind: 'coil',
        voltage: 'Vcoil',
        current: 'I',
        marked: {
          resistance: { value: 8.2, text: '8.2' },
          inductance: { value: 0.15, text: '150 mH' },
        },
      },
      {
        id: 'C',
        kind: 'capacitor',
        label: 'Run capacitor',
        voltage: 'VC',
        current: 'I',
        marked: { capacitance: { value: 16e-6, text: '16 µF', limit: 0.8e-6 } },
      },
    ],
    circuit: { series: [{ element: 'R' }, { element: 'coil' }, { element: 'C' }] },
    ...(readings.length > 0 && { readings }),
  })
}
