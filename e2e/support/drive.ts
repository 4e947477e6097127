import type { BrowserContext } from '@playwright/test'

/** What a driven page can do, as fast as the page itself allows. */
export interface Driver {
  /** Types into the field of that accessible name, over what stood there, and leaves it. */
  type(name: string, text: string): Promise<void>
  /** Presses a verb; one that is not offered is passed over. */
  press(verb: string): Promise<void>
  read(name: string): string
  wait(milliseconds: number): Promise<void>
}

declare global {
  interface Window {
    drive: Driver
  }
}

/** Gives every page of a context its driver: it does what hands do, without waiting for them. */
export async function addDrivers(context: BrowserContext): Promise<void> {
  await context.addInitScript(() => {
    const fieldOf = (name: string): HTMLInputElement => {
      const labelled = document.querySelector<HTMLInputElement>(`input[aria-label="${name}"]`)
      const label = [...document.querySelectorAll('label')].find(
        (each) => each.textContent === name,
      )
      const field = labelled ?? document.getElementById(label?.htmlFor ?? '')
      if (!(field instanceof HTMLInputElement)) throw new Error(`There is no field ${name}.`)
      return field
    }
    const setValue = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set
    // React renders what an event changed before the next event comes, as it does for hands.
    const rendered = () => new Promise<void>((resolve) => setTimeout(resolve))
    window.drive = {
      type: async (name, text) => {
        const field = fieldOf(name)
        field.closest('details')?.setAttribute('open', '')
        field.focus()
        await rendered()
        setValue?.call(field, text)
        field.dispatchEvent(new InputEvent('input', { bubbles: true }))
        await rendered()
        field.blur()
      },
      press: async (verb) => {
        const button = [...document.querySelectorAll('button')].find(
          (each) => each.textContent === verb,
        )
        button?.click()
        await rendered()
      },
      read: (name) => fieldOf(name).value,
      wait: (milliseconds) => new Promise((resolve) => setTimeout(resolve, milliseconds)),
    }
  })
}

/** A row of numbers in [0, 1) that is the same for the same seed: a linear congruence, from memory. */
export function createRandom(seed: number): () => number {
  let state = seed >>> 0
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0
    return state / 2 ** 32
  }
}
