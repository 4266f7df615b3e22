import { themeQuartz } from 'ag-grid-community'

/**
 * The grid in the app's own tokens. Each parameter names a CSS variable, so the grid follows a change of theme by itself.
 * Import it only from a page that has a grid: it brings the grid's library along.
 */
export const gridTheme = themeQuartz.withParams({
  backgroundColor: 'var(--surface)',
  foregroundColor: 'var(--ink)',
  browserColorScheme: 'inherit',
  accentColor: 'var(--brick)',
  textColor: 'var(--ink)',
  subtleTextColor: 'var(--muted)',
  invalidColor: 'var(--oxblood)',

  borderColor: 'var(--line)',
  borderRadius: 4,
  wrapperBorderRadius: 4,
  wrapperBorder: '1px solid var(--line)',
  columnBorder: '1px solid var(--line)',
  rowBorder: '1px solid var(--line)',
  pinnedColumnBorder: '1px solid var(--edge)',

  fontFamily: 'var(--font-words)',
  fontSize: 13,
  spacing: 6,
  rowHeight: 28,
  headerHeight: 30,
  listItemHeight: 28,
  cellHorizontalPadding: 8,

  headerBackgroundColor: 'var(--sunk)',
  headerTextColor: 'var(--ink)',
  headerFontWeight: 600,
  headerFontSize: 12,

  rowHoverColor: 'color-mix(in srgb, var(--ink) 4%, transparent)',
  selectedRowBackgroundColor: 'color-mix(in srgb, var(--brick) 10%, var(--surface))',
  inputFocusBorder: '1px solid var(--brick)',
  inputFocusShadow: 'none',
  focusShadow: 'none',
  popupShadow: '0 2px 8px rgb(0 0 0 / 18%)',
  cardShadow: '0 2px 8px rgb(0 0 0 / 18%)',
})
