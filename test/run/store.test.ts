import { describe, expect, it } from 'vitest'
import { layeredStore, memoryStore } from '../../src/run/store'
import { resultOf } from './fakes'

describe('the store in memory', () => {
  it('gives back what was put, and null for what it does not know', async () => {
    const store = memoryStore(2)
    await store.put('a', resultOf('a'))
    expect(await store.get('a')).toEqual(resultOf('a'))
    expect(await store.get('b')).toBeNull()
  })

  it('forgets the result used least recently when it is full', async () => {
    const store = memoryStore(2)
    await store.put('a', resultOf('a'))
    await store.put('b', resultOf('b'))
    await store.get('a')
    await store.put('c', resultOf('c'))
    expect(await store.get('b')).toBeNull()
    expect(await store.get('a')).toEqual(resultOf('a'))
    expect(await store.get('c')).toEqual(resultOf('c'))
  })
})

describe('a store in two layers', () => {
  it('asks the far one only once for a result', async () => {
    const far = memoryStore(9)
    await far.put('a', resultOf('a'))
    let asked = 0
    const counting = { ...far, get: (key: string) => (asked++, far.get(key)) }
    const store = layeredStore(memoryStore(9), counting)
    expect(await store.get('a')).toEqual(resultOf('a'))
    expect(await store.get('a')).toEqual(resultOf('a'))
    expect(asked).toBe(1)
  })

  it('puts into both', async () => {
    const near = memoryStore(9)
    const far = memoryStore(9)
    await layeredStore(near, far).put('a', resultOf('a'))
    expect(await near.get('a')).toEqual(resultOf('a'))
    expect(await far.get('a')).toEqual(resultOf('a'))
  })
})
