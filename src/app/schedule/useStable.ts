import { useRef } from 'react'

/** The same object as last time while its contents, plain data, are the same. */
export function useStable<Value>(value: Value): Value {
  const kept = useRef({ value, text: JSON.stringify(value) })
  const text = JSON.stringify(value)
  if (kept.current.text !== text) kept.current = { value, text }
  return kept.current.value
}
