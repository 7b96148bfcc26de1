import { describe, expect, it } from 'vitest'
import { memoryStore } from '../../src/run/store'
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
