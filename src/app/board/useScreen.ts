import { type RefObject, useLayoutEffect, useState, useSyncExternalStore } from 'react'
import type { Theme } from '../../drawing'
import type { Size } from './view'

const dark = window.matchMedia('(prefers-color-scheme: dark)')

/** Light or dark, as the system has it. */
export function useTheme(): Theme {
  return useSyncExternalStore(onThemeChange, currentTheme)
}

function onThemeChange(changed: () => void): () => void {
  dark.addEventListener('change', changed)
  return () => dark.removeEventListener('change', changed)
}

function currentTheme(): Theme {
  return dark.matches ? 'dark' : 'light'
}

/** Device pixels in a CSS pixel; it changes when a window moves to another screen or is zoomed. */
export function usePixelRatio(): number {
  return useSyncExternalStore(onPixelRatioChange, currentPixelRatio)
}

function onPixelRatioChange(changed: () => void): () => void {
  const current = window.matchMedia(`(resolution: ${window.devicePixelRatio}dppx)`)
  current.addEventListener('change', changed)
  window.addEventListener('resize', changed)
  return () => {
    current.removeEventListener('change', changed)
    window.removeEventListener('resize', changed)
  }
}

function currentPixelRatio(): number {
  return window.devicePixelRatio
}

/** The size of an element in CSS pixels, as it is now. */
export function useBoardSize(root: RefObject<HTMLElement | null>): Size {
  const [size, setSize] = useState<Size>({ width: 600, height: 420 })
  useLayoutEffect(() => {
    const element = root.current
    if (!element) return
    const measure = () => {
      const { clientWidth: width, clientHeight: height } = element
      setSize((old) => (old.width === width && old.height === height ? old : { width, height }))
    }
    measure()
    const observer = new ResizeObserver(measure)
    observer.observe(element)
    return () => observer.disconnect()
  }, [root])
  return size
}
