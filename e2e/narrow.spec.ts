import type { Page } from '@playwright/test'
import { emptySheet, type Sheet } from '../src/sheet'
import { brakeSheet } from './support/circuit'
import { fullSheet, longSheet } from './support/full'
import { openPage, unfold } from './support/page'
import { screens } from './support/screens'
import { expect, test } from './support/test'

const sheets: readonly (readonly [string, Sheet | undefined])[] = [
  ['a first visit', undefined],
  ['an empty sheet', emptySheet()],
  ['a full sheet', fullSheet],
  ['the longest texts', longSheet],
  ['a circuit', brakeSheet()],
]

for (const [name, sheet] of sheets) {
  test(`${name}: nothing scrolls sideways, down to 320 px`, async ({ page }) => {
    await page.setViewportSize({ width: 1280, height: 800 })
    await openPage(page, sheet)
    for (const group of [
      'Title block',
      'Before you measure',
      'Criterion and conclusion',
      'Paper, scale and reference',
    ]) {
      await unfold(page, group)
    }
    for (const width of [1280, 820, 390, 320]) {
      await page.setViewportSize({ width, height: 800 })
      await expect.poll(() => sideways(page), `at ${width} px`).toEqual([])
    }
  })
}

test.describe('under a finger', () => {
  test.use({ hasTouch: true, isMobile: true, viewport: { width: 390, height: 844 } })

  for (const { name, reach } of screens) {
    test(`${name}: every target has 44 px to itself`, async ({ page }) => {
      await reach(page)
      for (const [width, height] of [
        [390, 844],
        [820, 1180],
      ] as const) {
        await page.setViewportSize({ width, height })
        await expect.poll(() => smallTargets(page), `at ${width} px`).toEqual([])
      }
    })
  }
})

/**
 * What can only be seen by scrolling sideways, and the controls that no scrolling brings into sight.
 * The one line of verbs that a phone moves under the finger is meant to be so.
 */
async function sideways(page: Page): Promise<readonly string[]> {
  return page.evaluate(() => {
    const strip = 'header > .verbs'
    const nameOf = (element: Element) =>
      `${element.tagName} “${element.getAttribute('aria-label') ?? element.textContent?.slice(0, 30)}”`
    const isWide = ({ scrollWidth, clientWidth }: Element) => scrollWidth > clientWidth + 1
    const all = [...document.querySelectorAll('html, body, body *')]
    const scrolling = all.filter((element) => {
      const scrolls = /auto|scroll/.test(getComputedStyle(element).overflowX)
      return isWide(element) && (scrolls || element.matches('html')) && !element.matches(strip)
    })
    const width = document.documentElement.clientWidth
    const isClipped = (element: Element) => {
      for (let at = element.parentElement; at; at = at.parentElement) {
        if (/hidden|clip/.test(getComputedStyle(at).overflowX)) return true
      }
      return false
    }
    const cut = all.filter((element) => {
      if (element.closest(`${strip}, .visually-hidden`)) return false
      const { left, right } = element.getBoundingClientRect()
      if (!element.checkVisibility() || (right <= width + 1 && left >= -1)) return false
      return element.matches('button, input, select, textarea, summary') || !isClipped(element)
    })
    return [
      ...scrolling.map((element) => `${nameOf(element)} scrolls sideways`),
      ...cut.map((element) => `${nameOf(element)} is cut off`),
    ]
  })
}

/**
 * The targets that are less than 44 px wide or high and have no such room either: a circle of 44 px
 * about the middle of each must not touch another target.
 */
async function smallTargets(page: Page): Promise<readonly string[]> {
  return page.evaluate(() => {
    const least = 44
    const open = document.querySelector('dialog[open]') ?? document.body
    const targets = [
      ...open.querySelectorAll('button, input, select, textarea, summary, a[href], label.file'),
    ].filter((element) => {
      const isHidden = element.matches('.visually-hidden, :disabled')
      return !isHidden && element.checkVisibility({ visibilityProperty: true })
    })
    const boxes = targets.map((element) => element.getBoundingClientRect())
    return targets.flatMap((element, at) => {
      const { width, height, left, top } = boxes[at] as DOMRect
      if (Math.min(width, height) >= least - 0.5) return []
      const middle = { x: left + width / 2, y: top + height / 2 }
      const crowded = targets.some((other, index) => {
        const box = boxes[index] as DOMRect
        if (other === element || other.contains(element) || element.contains(other)) return false
        const dx = Math.max(box.left - middle.x, 0, middle.x - box.right)
        const dy = Math.max(box.top - middle.y, 0, middle.y - box.bottom)
        return Math.hypot(dx, dy) < least / 2
      })
      const name = element.getAttribute('aria-label') ?? element.textContent?.slice(0, 30)
      return crowded ? [`${element.tagName} “${name}”: ${width} × ${height}`] : []
    })
  })
}
