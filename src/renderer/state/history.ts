import { computed, shallowRef, type ComputedRef, type ShallowRef } from 'vue'

/** Changes kept for undoing. */
const DEEPEST = 200

/** A value with named changes that can be undone. The value is plain data and replaced whole. */
export interface History<T> {
  readonly value: Readonly<ShallowRef<T>>
  /** Name of the change that undo would take back; null when there is none. */
  readonly undoName: ComputedRef<string | null>
  readonly redoName: ComputedRef<string | null>
  /**
   * Makes a change. Changes of the same name and field that follow each other become one, so that typing a
   * number is undone at once.
   */
  change(name: string, next: T, field?: string): void
  undo(): void
  redo(): void
  /** A new value with no past. */
  reset(value: T): void
}

interface Step<T> {
  readonly name: string
  readonly field: string | null
  readonly before: T
}

/** A history that begins with a value. */
export function createHistory<T>(initial: T): History<T> {
  const value = shallowRef(initial) as ShallowRef<T>
  const past = shallowRef<readonly Step<T>[]>([])
  const future = shallowRef<readonly (Step<T> & { readonly after: T })[]>([])
  return {
    value,
    undoName: computed(() => past.value.at(-1)?.name ?? null),
    redoName: computed(() => future.value.at(-1)?.name ?? null),
    change(name, next, field) {
      if (next === value.value) return
      const last = past.value.at(-1)
      const joins =
        field !== undefined && future.value.length === 0 && last?.field === field && last.name === name
      if (!joins)
        past.value = [...past.value, { name, field: field ?? null, before: value.value }].slice(-DEEPEST)
      future.value = []
      value.value = next
    },
    undo() {
      const step = past.value.at(-1)
      if (step === undefined) return
      past.value = past.value.slice(0, -1)
      future.value = [...future.value, { ...step, after: value.value }]
      value.value = step.before
    },
    redo() {
      const step = future.value.at(-1)
      if (step === undefined) return
      future.value = future.value.slice(0, -1)
      past.value = [...past.value, { name: step.name, field: null, before: value.value }]
      value.value = step.after
    },
    reset(next) {
      past.value = []
      future.value = []
      value.value = next
    },
  }
}
