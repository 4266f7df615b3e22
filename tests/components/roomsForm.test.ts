import { flushPromises, mount } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { ProblemError, unreachable } from '../../src/api/ProblemError.ts'
import { roomEditor, type RoomEditor } from '../../src/components/rooms/roomEditor.ts'
import RoomForm from '../../src/components/rooms/RoomForm.vue'
import type { Room, RoomPatch } from '../../shared/schemas/room.ts'
import { buildKeyedRoom } from '../support/buildKeyedRoom.ts'

let patches: RoomPatch[]
let refusals: unknown[]
let laidBy: unknown[]

function editorOf(room: Room, takenUp: Parameters<typeof roomEditor>[1]['takenUp'] = null): RoomEditor {
  return roomEditor(room, {
    send: async (saved, patch) => {
      patches.push(patch)
      const refusal = refusals.shift()
      if (refusal) throw refusal
      return { ...saved, ...patch, version: saved.version + 1 }
    },
    onSaved: () => {},
    layBy: (kept) => laidBy.push(kept && structuredClone(JSON.parse(JSON.stringify(kept)))),
    takenUp,
  })
}

function mountForm(editor: RoomEditor) {
  return mount(RoomForm, {
    props: { draft: editor.draft, problems: editor.problems.value },
    attachTo: document.body,
    global: { stubs: { RouterLink: true } },
  })
}

/** Types a text into the field of that label, as a keyboard would. */
async function type(form: ReturnType<typeof mountForm>, label: string, text: string): Promise<void> {
  const field = fieldOf(form, label)
  await field.trigger('focus')
  await field.setValue(text)
}

function fieldOf(form: ReturnType<typeof mountForm>, label: string) {
  const id = form
    .findAll('label')
    .find((one) => one.text() === label)
    ?.attributes('for')
  return form.get(`[id="${id}"]`)
}

describe('RoomForm', () => {
  beforeEach(() => {
    vi.useFakeTimers()
    patches = []
    refusals = []
    laidBy = []
  })

  afterEach(() => {
    vi.useRealTimers()
  })

  it('saves a changed length alone, in inches, however it was written', async () => {
    const editor = editorOf(buildKeyedRoom())
    const form = mountForm(editor)

    await type(form, 'Length', '3.81 m')
    await type(form, 'Width', '11-6 1/2')
    await vi.advanceTimersByTimeAsync(1_000)

    expect(patches).toEqual([{ shape: { kind: 'rectangle', lengthIn: 150, widthIn: 138.5 } }])
  })

  it('saves nothing while a length can’t be read, keeps the text and lays it by', async () => {
    const editor = editorOf(buildKeyedRoom())
    const form = mountForm(editor)

    await type(form, 'Width', `12'' 6`)
    await vi.advanceTimersByTimeAsync(1_000)

    expect(patches).toEqual([])
    expect((fieldOf(form, 'Width').element as HTMLInputElement).value).toBe(`12'' 6`)
    expect(editor.problems.value.get('width')?.message).toContain('two inch marks')
    expect(laidBy.at(-1)).toMatchObject({ draft: { widthText: `12'' 6` } })
  })

  it('goes on from what was laid by, and saves it once it can be read', async () => {
    const before = editorOf(buildKeyedRoom())
    await type(mountForm(before), 'Width', `11' 6`)
    await flushPromises()
    const takenUp = laidBy.at(-1) as { draft: RoomEditor['draft']; saved: Room }

    const editor = editorOf(buildKeyedRoom(), takenUp)
    await vi.advanceTimersByTimeAsync(1_000)

    expect(editor.draft.widthText).toBe(`11' 6`)
    expect(patches.at(-1)).toEqual({ shape: { kind: 'rectangle', lengthIn: 150, widthIn: 138 } })
  })

  it('puts what somebody else changed meanwhile into the form, and saves mine beside it', async () => {
    refusals = [
      new ProblemError({
        status: 412,
        code: 'stale',
        detail: 'Changed.',
        current: buildKeyedRoom({ version: 4, note: 'Soft floor', use: 'living' }),
      }),
    ]
    const editor = editorOf(buildKeyedRoom())
    const form = mountForm(editor)

    await type(form, 'Length', '13')
    await vi.advanceTimersByTimeAsync(1_000)

    expect(patches.at(-1)).toEqual({ shape: { kind: 'rectangle', lengthIn: 156, widthIn: 120 } })
    expect(editor.draft).toMatchObject({ note: 'Soft floor', use: 'living', lengthText: '13' })
  })

  it('adds an opening by one press, and one more of it by the next', async () => {
    const editor = editorOf(buildKeyedRoom({ openings: [] }))
    const form = mountForm(editor)
    const window = form.findAll('.openings button').find((button) => button.text().includes(`3' 0" × 4' 0"`))

    await window?.trigger('click')
    await window?.trigger('click')
    await vi.advanceTimersByTimeAsync(1_000)

    expect(patches.at(-1)).toEqual({
      openings: [{ kind: 'window', widthIn: 36, heightIn: 48, count: 2, fromWalls: true, fromBase: true }],
    })
  })

  it('turns a deduction off for the walls', async () => {
    const tub = { kind: 'tub' as const, widthIn: 60, heightIn: 20, depthIn: 30, count: 1, fromWalls: true, fromFloor: true, fromBase: true }
    const form = mountForm(editorOf(buildKeyedRoom({ deductions: [tub] })))

    await form.get('.deductions input[type="checkbox"]').setValue(false)
    await vi.advanceTimersByTimeAsync(1_000)

    expect(patches).toEqual([{ deductions: [{ ...tub, fromWalls: false }] }])
  })

  it('takes the ceiling away when it hasn’t been measured', async () => {
    const form = mountForm(editorOf(buildKeyedRoom()))

    await form.get('input[type="radio"][value="none"]').setValue(true)
    await vi.advanceTimersByTimeAsync(1_000)

    expect(patches).toEqual([{ ceiling: null }])
  })

  it('begins the wall runs with the walls of the rectangle', async () => {
    const editor = editorOf(buildKeyedRoom())
    const form = mountForm(editor)

    await form.get('input[type="radio"][value="polygon"]').setValue(true)

    expect(editor.draft.walk.runs.map(({ lengthText, turn }) => `${lengthText} ${turn}`)).toEqual([
      `12' 6" right`,
      `10' 0" right`,
      `12' 6" right`,
      `10' 0" right`,
    ])
    expect(form.text()).toContain('The walls come round to the first corner.')
  })

  it('says by how much the walls don’t close, and closes them when asked', async () => {
    const editor = editorOf(buildKeyedRoom())
    const form = mountForm(editor)
    await form.get('input[type="radio"][value="polygon"]').setValue(true)

    await form
      .findAll('button')
      .find((button) => button.attributes('aria-label') === 'Remove wall 4')
      ?.trigger('click')
    expect(form.get('.gap').text()).toContain(`Closes by 10' 0"`)
    await form
      .findAll('button')
      .find((button) => button.text() === 'Close automatically')
      ?.trigger('click')

    expect(editor.draft.walk.runs).toHaveLength(4)
    expect(form.text()).toContain('The walls come round to the first corner.')
  })

  it('goes to the next field by Enter and asks for another room by Ctrl+Enter', async () => {
    const form = mountForm(editorOf(buildKeyedRoom()))
    const length = fieldOf(form, 'Length').element as HTMLInputElement
    length.focus()

    await fieldOf(form, 'Length').trigger('keydown', { key: 'Enter' })
    expect(document.activeElement).toBe(fieldOf(form, 'Width').element)
    await fieldOf(form, 'Width').trigger('keydown', { key: 'Enter', ctrlKey: true })

    expect(form.emitted('addAnother')).toHaveLength(1)
  })

  it('tells what the server had against a field at that field', async () => {
    refusals = [
      new ProblemError({
        status: 422,
        code: 'invalid',
        detail: 'No.',
        errors: [{ path: 'openings[1].widthIn', code: 'x', message: 'is wider than the wall' }],
      }),
    ]
    const editor = editorOf(buildKeyedRoom())

    await type(mountForm(editor), `Width of Window 2`, '40')
    await vi.advanceTimersByTimeAsync(1_000)

    expect(editor.problems.value.get(`opening-${editor.draft.openings[1]?.id}-width`)?.message).toBe('is wider than the wall')
    expect(editor.draft.openings[1]?.widthText).toBe('40')
  })

  it('keeps trying without a connection', async () => {
    refusals = [unreachable()]
    const editor = editorOf(buildKeyedRoom())

    await type(mountForm(editor), 'Length', '13')
    await vi.advanceTimersByTimeAsync(800)
    expect(editor.save.status.value).toBe('waiting')
    await vi.advanceTimersByTimeAsync(5_000)

    expect(editor.save.status.value).toBe('saved')
    expect(laidBy.at(-1)).toBeNull()
  })
})
