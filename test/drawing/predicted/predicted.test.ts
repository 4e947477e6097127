import { describe, expect, it } from 'vitest'
import { boundsOf, layout, type Scene } from '../../../src/drawing'
import { type ComparisonEvaluation, type Evaluation, quick, type Sheet } from '../../../src/sheet'
import { overlapsOf } from '../overlap'
import { fan } from '../sheets'

const values: readonly (readonly [string, number, number])[] = [
  ['I', 1.6, 0],
  ['VR', 19.2, 0],
  ['VL', 55, 75],
  ['VC', 30, -90],
  ['VS', 40.9, 34.1],
]

function predictedAs(figures: typeof values): Pick<Evaluation, 'comparison'> {
  return {
    comparison: figures.map(
      ([phasor, magnitude, angle]): ComparisonEvaluation => ({
        phasor,
        predicted: { magnitude, angle },
      }),
    ),
  }
}

function drawn(sheet: Sheet, figures = values, withoutPrediction = false): Scene {
  return layout(sheet, { ...quick(sheet), ...predictedAs(figures) }, { withoutPrediction })
}

function shaftsOf({ items }: Scene, part: 'arrow' | 'predicted') {
  return items.flatMap((item) => (item.part === part && item.kind === 'lines' ? [item] : []))
}

const unread: Sheet = {
  ...fan,
  phasors: fan.phasors.map(({ magnitude, angle, ...rest }) =>
    rest.id === 'VS' ? { ...rest, ...(magnitude && { magnitude }), ...(angle && { angle }) } : rest,
  ),
}

describe('the predicted diagram', () => {
  it('lies under the measured one, from the same starts and to the same scale', () => {
    const scene = drawn(fan)
    const parts = scene.items.map(({ part }) => part)
    expect(parts.lastIndexOf('predicted')).toBeLessThan(parts.indexOf('arrow'))
    const scale = scene.unitsPerCentimetre.voltage ?? 1
    const first = scene.arrows.find(({ key }) => key === 'term:s1:0')
    const heads = scene.items.filter(({ part, kind }) => part === 'predicted' && kind === 'path')
    expect(heads).toHaveLength(5)
    const tips = heads.map((item) => (item.kind === 'path' ? item.points.slice(0, 2) : []))
    const x = (first?.from.x ?? 0) + (19.2 * 10) / scale
    expect(tips).toContainEqual([x, first?.from.y])
  })

  it('is thinner than what was measured and broken, so that no colour is needed', () => {
    const scene = drawn(fan)
    const predicted = shaftsOf(scene, 'predicted')
    const measured = shaftsOf(scene, 'arrow')
    const thinnest = Math.min(...measured.map(({ width = 0 }) => width))
    expect(predicted.every(({ dash, width = 1 }) => dash && width < thinnest / 1.5)).toBe(true)
    expect(measured.some(({ dash }) => dash)).toBe(false)
  })

  it('is labelled as predicted where nothing was measured yet, and there alone', () => {
    const textsOf = (scene: Scene) =>
      scene.items.flatMap((item) =>
        item.part === 'label' && item.kind === 'text'
          ? [item.runs.map(({ text }) => text).join('')]
          : [],
      )
    const marked = textsOf(drawn(unread)).filter((text) => text.includes('predicted'))
    expect(marked).toHaveLength(4)
    expect(marked.some((text) => /^Vcoil\u00a055\.0 V ∠ 75\.0° predicted$/.test(text))).toBe(true)
    expect(textsOf(drawn(fan)).filter((text) => text.includes('predicted'))).toEqual([])
    for (const sheet of [unread, fan]) expect(overlapsOf(drawn(sheet))).toEqual([])
  })

  it('keeps the drawing where it is while readings that are as predicted come in', () => {
    const before = drawn(unread)
    const after = drawn(fan)
    expect(after.unitsPerCentimetre).toEqual(before.unitsPerCentimetre)
  })

  it('stays inside the frame: what reaches beyond it is counted instead', () => {
    const scene = drawn(fan, [['VL', 4000, 75], ...values.slice(3)])
    expect(scene.predictedLeftOut).toBeGreaterThan(0)
    for (const item of scene.items.filter(({ part }) => part === 'predicted')) {
      const { left, right, bottom, top } = boundsOf(item)
      expect(Math.min(left, bottom)).toBeGreaterThan(0)
      expect(right).toBeLessThan(scene.width)
      expect(top).toBeLessThan(scene.height)
    }
  })

  it('is left out on request, and the sheet is then drawn as if nothing were predicted', () => {
    expect(drawn(fan, values, true)).toEqual(layout(fan, quick(fan)))
  })
})
