/** One thing to do from a menu, or the line that parts two groups of them. */
export type MenuEntry = { label: string; run: () => void; isDisabled?: boolean } | 'line'
