import { defineStore } from 'pinia'
import { computed, ref } from 'vue'
import { mayRole, type Action } from '../../shared/access/permissions.ts'
import type { CurrentUser } from '../../shared/schemas/account.ts'
import { readCurrentUser, signIn as signInAtServer, signOut as signOutAtServer } from '../api/accounts.ts'
import { queryClient } from '../api/queryClient.ts'

/** Who is signed in in this tab. The session itself is a cookie that no script can read. */
export const useSessionStore = defineStore('session', () => {
  const user = ref<CurrentUser | null>(null)
  const isKnown = ref(false)
  /** A sentence for the sign-in page: why one stands there. */
  const notice = ref('')
  const isSignedIn = computed(() => user.value !== null)

  /** Asks the server once who is signed in; throws when it can't be reached. */
  async function load(): Promise<void> {
    if (isKnown.value) return
    user.value = await readCurrentUser()
    isKnown.value = true
  }

  async function signIn(credentials: { email: string; password: string }): Promise<void> {
    enter(await signInAtServer(credentials))
  }

  /** Takes over a user whom the server has just signed in. */
  function enter(signedIn: CurrentUser): void {
    queryClient.clear()
    user.value = signedIn
    isKnown.value = true
    notice.value = ''
  }

  async function signOut(): Promise<void> {
    await signOutAtServer()
    leave('')
  }

  /** Forgets the user and all that was read for them. */
  function leave(why: string): void {
    user.value = null
    isKnown.value = true
    notice.value = why
    queryClient.clear()
  }

  function may(action: Action): boolean {
    return user.value !== null && mayRole(user.value.role, action)
  }

  return { user, isSignedIn, notice, load, signIn, enter, signOut, leave, may }
})
