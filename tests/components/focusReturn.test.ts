import { flushPromises, mount } from '@vue/test-utils'
import { describe, expect, it, vi } from 'vitest'
import { defineComponent, nextTick, ref } from 'vue'
import BaseDialog from '../../src/components/base/BaseDialog.vue'

/** A page with a button that opens a dialog, which stays in the page when it is closed or is taken away with it. */
function mountPage(isTakenAway: boolean) {
  const isOpen = ref(false)
  const hasButton = ref(true)
  const page = defineComponent({
    components: { BaseDialog },
    setup: () => ({ isOpen, hasButton, isTakenAway }),
    template: `<main id="main" tabindex="-1">
      <button v-if="hasButton" id="opener" @click="isOpen = true">Open</button>
      <BaseDialog v-if="isOpen || !isTakenAway" v-model:is-open="isOpen" title="A dialog"><input id="inside" /></BaseDialog>
    </main>`,
  })
  mount(page, { attachTo: document.body, global: { stubs: { transition: false } } })
  return { isOpen, hasButton }
}

async function openFromButton(): Promise<void> {
  const opener = document.getElementById('opener')!
  opener.focus()
  opener.click()
  await settle()
  await vi.waitFor(() => expect(document.getElementById('inside')).not.toBeNull())
  document.getElementById('inside')!.focus()
}

async function settle(): Promise<void> {
  await flushPromises()
  await new Promise((resolve) => setTimeout(resolve, 30))
  await nextTick()
}

describe('A dialog that closes', () => {
  it.each([
    ['stays in the page', false],
    ['is taken out of the page with it', true],
  ])('gives the keyboard back to what opened it, when it %s', async (_, isTakenAway) => {
    const { isOpen } = mountPage(isTakenAway)
    await openFromButton()
    expect(document.activeElement?.id).toBe('inside')
    isOpen.value = false
    await vi.waitFor(() => expect(document.activeElement?.id).toBe('opener'))
  })

  it('gives it to the page when what opened it has gone with what was done', async () => {
    const { isOpen, hasButton } = mountPage(true)
    await openFromButton()
    hasButton.value = false
    isOpen.value = false
    await vi.waitFor(() => expect(document.activeElement?.id).toBe('main'))
  })
})
