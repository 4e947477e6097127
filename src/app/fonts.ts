import { useSyncExternalStore } from 'react'
import type { TextRun } from '../drawing'

const families = {
  sans: '"Phasogon Sans", "DejaVu Sans", Verdana, sans-serif',
  bold: '"Phasogon Bold", "DejaVu Sans", Verdana, sans-serif',
  symbol: '"Phasogon Symbol", "DejaVu Serif", Georgia, serif',
}

/** The canvas font of a run, its size in the context's unit. */
export function fontOf({ face, size }: Pick<TextRun, 'face' | 'size'>): string {
  return `${size}px ${families[face]}`
}

/** Settles when the bundled faces can be drawn with; a face that fails falls back and holds up nothing. */
export function loadFonts(): Promise<void> {
  loading ??= Promise.allSettled(
    (['sans', 'bold', 'symbol'] as const).map((face) =>
      document.fonts.load(fontOf({ face, size: 16 }), 'VΩ∠'),
    ),
  ).then(() => {
    loaded = true
  })
  return loading
}

let loading: Promise<void> | undefined
let loaded = false

/** Whether the bundled faces can be drawn with: until then a canvas leaves its text out. */
export function useFonts(): boolean {
  return useSyncExternalStore(onLoad, areLoaded)
}

function onLoad(changed: () => void): () => void {
  void loadFonts().then(changed)
  return () => undefined
}

function areLoaded(): boolean {
  return loaded
}
