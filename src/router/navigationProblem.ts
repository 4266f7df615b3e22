import { shallowRef } from 'vue'

/** Why the last page asked for could not be shown: the server can't be reached, or a part of the app didn't load. */
export const navigationProblem = shallowRef<{ error: unknown; wanted: string } | null>(null)
