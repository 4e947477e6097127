import { describe, expect, it } from 'vitest'
import { layout, svg } from '../../src/drawing'
import { quick, serializeSheet } from '../../src/sheet'
import { gallery } from './gallery'
import { overlapsOf } from './overlap'

describe.each(Object.entries(gallery))('the gallery’s %s', (name, { sheet, options }) => {
  const scene = layout(sheet, quick(sheet), options)

  it('is drawn as it was', async () => {
    await expect(svg(scene, serializeSheet(sheet))).toMatchFileSnapshot(`gallery/${name}.svg`)
  })

  it('has all its labels, and none covers anything', () => {
    expect(overlapsOf(scene)).toEqual([])
    expect(scene.labelsLeftOut).toBe(0)
  })
})
