import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { ProblemError, unreachable } from '../../src/api/ProblemError.ts'
import { useMergedSave } from '../../src/composables/useMergedSave.ts'

interface Fields {
  name: string
  note: string
  shape: { kind: string; lengthIn: number; widthIn: number }
}
type Saved = Fields & { version: number }

const first: Saved = { version: 1, name: 'Front bedroom', note: '', shape: { kind: 'rectangle', lengthIn: 150, widthIn: 120 } }

function fieldsOf({ name, note, shape }: Saved): Fields {
  return { name, note, shape }
}

function stale(current: Saved): ProblemError {
  return new ProblemError({ status: 412, code: 'stale', detail: 'Somebody else changed it.', current })
}

function refused(path: string): ProblemError {
  return new ProblemError({ status: 422, code: 'invalid', detail: 'Not so.', errors: [{ path, code: 'x', message: 'is no good' }] })
}

/** A server that keeps what it is sent, or answers as told. */
function fakeServer(...refusals: unknown[]) {
  const patches: Partial<Fields>[] = []
  const send = vi.fn(async (saved: Saved, patch: Partial<Fields>): Promise<Saved> => {
    patches.push(patch)
    const refusal = refusals.shift()
    if (refusal) throw refusal
    return { ...saved, ...patch, version: saved.version + 1 }
  })
  return { send, patches }
}

describe('useMergedSave', () => {
  beforeEach(() => {
    vi.useFakeTimers()
  })

  afterEach(() => {
    vi.useRealTimers()
  })

  it('sends what changed, once, after a rest in the typing', async () => {
    const { send, patches } = fakeServer()
    const save = useMergedSave(first, { fieldsOf, send })

    save.edit({ name: 'Bed' })
    await vi.advanceTimersByTimeAsync(300)
    save.edit({ name: 'Bedroom 1' })
    expect(save.status.value).toBe('saving')
    await vi.advanceTimersByTimeAsync(700)

    expect(patches).toEqual([{ name: 'Bedroom 1' }])
    expect(save.status.value).toBe('saved')
    expect(save.saved.value.version).toBe(2)
  })

  it('sends nothing for an edit that was taken back', async () => {
    const { send } = fakeServer()
    const save = useMergedSave(first, { fieldsOf, send })

    save.edit({ name: 'Bed' })
    save.edit({ name: 'Front bedroom' })
    await vi.advanceTimersByTimeAsync(1_000)

    expect(send).not.toHaveBeenCalled()
    expect(save.status.value).toBe('saved')
  })

  it('sends what was typed while a save was under way after it', async () => {
    const { patches, send } = fakeServer()
    const save = useMergedSave(first, {
      fieldsOf,
      send: async (saved, patch) => {
        await new Promise((resolve) => setTimeout(resolve, 500))
        return send(saved, patch)
      },
    })

    save.edit({ name: 'A' })
    await vi.advanceTimersByTimeAsync(700)
    save.edit({ name: 'AB' })
    await vi.advanceTimersByTimeAsync(3_000)

    expect(patches).toEqual([{ name: 'A' }, { name: 'AB' }])
    expect(save.mine.value.name).toBe('AB')
    expect(save.status.value).toBe('saved')
  })

  describe('when somebody else saved first', () => {
    it('merges what does not overlap and saves mine on top', async () => {
      const { patches, send } = fakeServer(stale({ ...first, version: 5, note: 'Soft floor' }))
      const onTheirs = vi.fn()
      const save = useMergedSave(first, { fieldsOf, send, onTheirs })

      save.edit({ name: 'Bedroom 1' })
      await save.flush()

      expect(patches).toEqual([{ name: 'Bedroom 1' }, { name: 'Bedroom 1' }])
      expect(save.mine.value).toEqual({ ...fieldsOf(first), name: 'Bedroom 1', note: 'Soft floor' })
      expect(onTheirs).toHaveBeenCalledWith(expect.objectContaining({ note: 'Soft floor' }), ['note'])
      expect(save.saved.value.version).toBe(6)
    })

    it('keeps both values of what is at odds and overwrites neither', async () => {
      const theirs = { ...first, version: 5, shape: { ...first.shape, lengthIn: 162 } }
      const { patches, send } = fakeServer(stale(theirs))
      const save = useMergedSave(first, { fieldsOf, send })

      save.edit({ shape: { ...first.shape, lengthIn: 156 }, note: 'mine' })
      await save.flush()

      expect(save.status.value).toBe('conflict')
      expect(save.conflicts.value).toEqual([{ path: 'shape.lengthIn', mine: 156, theirs: 162 }])
      expect(save.mine.value.shape.lengthIn).toBe(156)
      expect(patches.at(-1)).toEqual({ note: 'mine' })
    })

    it('saves mine over theirs once I say so', async () => {
      const { patches, send } = fakeServer(stale({ ...first, version: 5, name: 'Theirs' }))
      const save = useMergedSave(first, { fieldsOf, send })
      save.edit({ name: 'Mine' })
      await save.flush()

      save.keepMine('name')
      await vi.advanceTimersByTimeAsync(10)

      expect(patches.at(-1)).toEqual({ name: 'Mine' })
      expect(save.status.value).toBe('saved')
    })

    it('takes theirs once I say so, and sends nothing', async () => {
      const { send } = fakeServer(stale({ ...first, version: 5, name: 'Theirs' }))
      const onTheirs = vi.fn()
      const save = useMergedSave(first, { fieldsOf, send, onTheirs })
      save.edit({ name: 'Mine' })
      await save.flush()

      save.takeTheirs('name')
      await vi.advanceTimersByTimeAsync(10)

      expect(save.mine.value.name).toBe('Theirs')
      expect(onTheirs).toHaveBeenCalledWith(expect.objectContaining({ name: 'Theirs' }), ['name'])
      expect(send).toHaveBeenCalledTimes(1)
      expect(save.status.value).toBe('saved')
    })

    it('hears of it by itself too, and ignores what it knows already', () => {
      const save = useMergedSave(first, { fieldsOf, send: fakeServer().send })

      save.hear({ ...first, version: 3, note: 'Theirs' })
      save.hear({ ...first, version: 2, note: 'Late' })

      expect(save.mine.value.note).toBe('Theirs')
    })
  })

  describe('when the server refuses a field', () => {
    it('keeps it, says what was wrong, and saves the others', async () => {
      const { patches, send } = fakeServer(refused('shape.lengthIn'))
      const save = useMergedSave(first, { fieldsOf, send })

      save.edit({ shape: { ...first.shape, lengthIn: 1e9 }, note: 'kept' })
      await save.flush()

      expect(patches.at(-1)).toEqual({ note: 'kept' })
      expect(save.fieldErrors.value.map(({ path }) => path)).toEqual(['shape.lengthIn'])
      expect(save.mine.value.shape.lengthIn).toBe(1e9)
      expect(save.status.value).toBe('refused')
    })

    it('tries again once the field is put right', async () => {
      const { patches, send } = fakeServer(refused('name'))
      const save = useMergedSave(first, { fieldsOf, send })
      save.edit({ name: '?' })
      await save.flush()

      save.edit({ name: 'Bedroom' })
      await vi.advanceTimersByTimeAsync(1_000)

      expect(patches.at(-1)).toEqual({ name: 'Bedroom' })
      expect(save.status.value).toBe('saved')
    })
  })

  it('does not send for ever what is refused for a field that was not sent', async () => {
    const { send } = fakeServer(refused('note'), refused('note'), refused('note'))
    const save = useMergedSave(first, { fieldsOf, send })

    save.edit({ name: 'Bedroom 1' })
    await vi.advanceTimersByTimeAsync(60_000)

    expect(send).toHaveBeenCalledTimes(1)
    expect(save.status.value).toBe('refused')
  })

  describe('without a connection', () => {
    it('keeps what was typed and sends it by itself later', async () => {
      const { patches, send } = fakeServer(unreachable(), unreachable())
      const save = useMergedSave(first, { fieldsOf, send })

      save.edit({ name: 'Bedroom 1' })
      await save.flush()
      expect(save.status.value).toBe('waiting')
      save.edit({ note: 'typed meanwhile' })
      await vi.advanceTimersByTimeAsync(10_000)

      expect(patches.at(-1)).toEqual({ name: 'Bedroom 1', note: 'typed meanwhile' })
      expect(save.status.value).toBe('saved')
    })

    it('sends at once when the connection is back', async () => {
      const { send } = fakeServer(unreachable())
      const save = useMergedSave(first, { fieldsOf, send })
      save.edit({ name: 'Bedroom 1' })
      await save.flush()

      window.dispatchEvent(new Event('online'))
      await vi.advanceTimersByTimeAsync(0)

      expect(send).toHaveBeenCalledTimes(2)
      expect(save.status.value).toBe('saved')
    })
  })

  it('says that a refusal of another kind is not saved, and does not hammer the server', async () => {
    const { send } = fakeServer(new ProblemError({ status: 404, code: 'not-found', detail: 'There is no such room.' }))
    const save = useMergedSave(first, { fieldsOf, send })

    save.edit({ name: 'Bedroom 1' })
    await vi.advanceTimersByTimeAsync(60_000)

    expect(send).toHaveBeenCalledTimes(1)
    expect(save.status.value).toBe('refused')
    expect(save.mine.value.name).toBe('Bedroom 1')
  })
})
