'use client'
import { useCallback, useSyncExternalStore } from 'react'

const PREFIX = 'tenth-summer.'
const listeners = new Set<() => void>()

/**
 * A choice remembered on this device. Until the browser has spoken, and where storage is closed, it is `first`;
 * anything stored that is not among `choices` counts as nothing.
 */
export function useRemembered<T extends string>(name: string, first: T, choices: readonly T[]): [T, (value: T) => void] {
  const subscribe = useCallback((listener: () => void) => {
    listeners.add(listener)
    window.addEventListener('storage', listener)
    return () => {
      listeners.delete(listener)
      window.removeEventListener('storage', listener)
    }
  }, [])
  const stored = useSyncExternalStore(subscribe, () => readStored(name), () => null)
  const set = useCallback(
    (value: T) => {
      try {
        window.localStorage.setItem(PREFIX + name, value)
      } catch {
        held.set(name, value)
      }
      listeners.forEach((listener) => listener())
    },
    [name],
  )
  return [choices.find((choice) => choice === stored) ?? first, set]
}

/** Choices of this visit where the browser stores nothing. */
const held = new Map<string, string>()

function readStored(name: string): string | null {
  try {
    return window.localStorage.getItem(PREFIX + name) ?? held.get(name) ?? null
  } catch {
    return held.get(name) ?? null
  }
}
