import type { Page } from '@playwright/test'
import { emptySheet, type Sheet } from '../../src/sheet'
import { benchSheet } from './bench'
import { brakeSheet, circuitOf } from './circuit'
import { fullSheet } from './full'
import { openPage, unfold } from './page'
import { cell } from './schedule'
import { expect } from './test'

/** The sizes of window at which every screen is looked at. */
export const sizes = [
  { width: 1280, height: 800 },
  { width: 820, height: 1180 },
  { width: 390, height: 844 },
] as const

/** A screen of the page, and how to come to it. */
export interface Screen {
  readonly name: string
  /** The part of the page that it is about; all of it where nothing is said. */
  readonly part?: string
  readonly reach: (page: Page) => Promise<void>
}

async function afresh(page: Page, sheet?: Parameters<typeof openPage>[1]): Promise<void> {
  await page.goto('about:blank')
  await openPage(page, sheet)
}

async function pressVerb(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name, exact: true }).click()
}

/** A sheet whose check no longer holds. */
const signedSheet: Sheet = {
  ...benchSheet,
  job: {
    ...benchSheet.job,
    voided: [{ kind: 'checked', by: 'A. Berg', date: '2026-11-30', revision: '0' }],
  },
}

/** Opens a dialog, types into it what it refuses, and sees it refused. */
async function refusedBy(page: Page, opens: string, text: string, takes: string): Promise<void> {
  await afresh(page, benchSheet)
  await pressVerb(page, opens)
  await page.getByRole('dialog').getByRole('textbox').fill(text)
  await pressVerb(page, takes)
  await expect(page.getByRole('dialog').getByRole('alert')).toBeVisible()
}

/** Every screen that the page has. */
export const screens: readonly Screen[] = [
  { name: 'a first visit', reach: (page) => afresh(page) },
  { name: 'an empty sheet', reach: (page) => afresh(page, emptySheet()) },
  { name: 'a full sheet', reach: (page) => afresh(page, fullSheet) },
  {
    name: 'a picked row, a refused cell and a notice',
    reach: async (page) => {
      await afresh(page, benchSheet)
      await pressVerb(page, 'Delete sum Resultant')
      await cell(page, 'Magnitude', 'V2').fill('many')
      await cell(page, 'Magnitude', 'V2').press('Enter')
      await expect(page.getByRole('alert')).toBeVisible()
      await expect(page.getByRole('group', { name: 'The row of V2' })).toBeVisible()
    },
  },
  {
    name: 'a circuit with a bad capacitor',
    part: '.circuit',
    reach: async (page) => {
      await afresh(
        page,
        brakeSheet([
          { id: 'r1', of: 'I', kind: 'magnitude', shown: '1.130' },
          { id: 'r2', of: 'I', kind: 'angle', shown: '74.3', sense: 'leads' },
          { id: 'r3', of: 'VR', kind: 'magnitude', shown: '53.1' },
          { id: 'r4', of: 'VC', kind: 'magnitude', shown: '274.6' },
        ]),
      )
      await circuitOf(page).getByText('Assumed tolerance, wet places, discharging').click()
      await circuitOf(page).getByLabel('More of coil').click()
      await expect(circuitOf(page).getByText(/below tolerance/)).toBeVisible()
    },
  },
  {
    name: 'the fields of the sheet',
    part: '[aria-label="Sheet"]',
    reach: async (page) => {
      await afresh(page, benchSheet)
      await unfold(page, 'Title block')
      await unfold(page, 'Paper, scale and reference')
      await expect(page.getByRole('textbox', { name: 'Job number' })).toBeVisible()
    },
  },
  {
    name: 'the hazards, and signatures that are void',
    part: '[aria-label="Sheet"]',
    reach: async (page) => {
      await afresh(page, signedSheet)
      await unfold(page, 'Title block')
      await page.getByText('Before you measure', { exact: true }).click()
      await page.getByText('Criterion and conclusion', { exact: true }).click()
      await pressVerb(page, 'Add the usual ones')
      await expect(page.getByRole('group', { name: 'Hazard 5' })).toBeVisible()
      await expect(page.getByRole('list', { name: 'Voided signatures' })).toBeVisible()
    },
  },
  {
    name: 'the report as it will be printed',
    part: 'dialog',
    reach: async (page) => {
      await afresh(page, benchSheet)
      await pressVerb(page, 'Report')
      await expect(page.locator('.page-paper > svg').first()).toBeVisible()
      await expect(page.getByText('Everything fits.')).toBeVisible()
    },
  },
  {
    name: 'the dialog to open a sheet, with a refusal',
    part: 'dialog',
    reach: (page) => refusedBy(page, 'Open', 'nothing', 'Open the link'),
  },
  {
    name: 'the dialog for rows, with a refusal',
    part: 'dialog',
    reach: (page) => refusedBy(page, 'Paste rows', 'V9\tx\ty', 'Add rows'),
  },
  {
    name: 'the menu to save a drawing',
    part: 'header',
    reach: async (page) => {
      await afresh(page, benchSheet)
      await pressVerb(page, 'Save drawing')
      await expect(page.getByRole('button', { name: /^SVG/ })).toBeVisible()
    },
  },
]
