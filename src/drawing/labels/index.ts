import type { Box } from '../geometry'
import type { Picture } from '../picture'
import type { Item } from '../scene'
import type { Palette } from '../theme'
import { createGround } from './ground'
import { labelItems } from './items'
import { placeLabels } from './place-labels'
import type { Register } from './register'
import type { Wish } from './wish'
import { wishesOf } from './wishes'

/**
 * The labels of a drawing, each clear of all that is drawn and of the others, and how many found no
 * room.
 *
 * @param items What is drawn so far.
 * @param fences Boxes that labels and leaders keep out of.
 * @param others Labels of what is no part of the picture: they come last.
 */
export function createLabels(
  items: readonly Item[],
  picture: Picture,
  register: Register,
  frame: Box,
  fences: readonly Box[],
  palette: Palette,
  others: readonly Wish[] = [],
): { readonly items: readonly Item[]; readonly leftOut: number } {
  const wishes = [...wishesOf(picture, register, frame, palette), ...others]
  if (wishes.length === 0) return { items: [], leftOut: 0 }
  const placed = placeLabels(wishes, createGround(items, frame, fences))
  return { items: labelItems(placed, palette), leftOut: wishes.length - placed.length }
}
