import type { ICellEditorComp, ICellEditorParams } from 'ag-grid-community'
import type { CellColumn } from '../../../composables/lineCells.ts'
import type { LineRow } from '../../../composables/lineRow.ts'
import type { GridContext } from '../gridContext.ts'
import { h, render, type AppContext, type Component } from 'vue'

/** What an editor component exposes to the grid. */
export interface ExposedEditor {
  /** What is being edited, for a screen reader. */
  label: string
  getValue(): unknown
  isPopup(): boolean
  /** Called once the editor stands in the page: the keyboard goes to it before the next key comes. */
  takeFocus(): void
}

/**
 * A Vue component as an editor of the grid, mounted in one step. The grid's own Vue wrapper would copy rows and context, and attach the editor a moment after
 * the key that opened it, so that a quick second key went astray.
 */
export function vueCellEditor(component: Component, appContext: AppContext | null) {
  return class VueCellEditor implements ICellEditorComp {
    private readonly place = document.createElement('div')
    private editor: ExposedEditor | null = null
    private context: GridContext | null = null

    init(params: ICellEditorParams<LineRow, unknown, GridContext>): void {
      this.context = params.context
      params.context.editing.onStarted(params.data, params.column.getColId() as CellColumn)
      const node = h(component, { params })
      node.appContext = appContext
      this.place.className = 'cell-editor'
      render(node, this.place)
      this.editor = (node.component?.exposed ?? null) as ExposedEditor | null
    }

    getGui(): HTMLElement {
      return this.place
    }

    afterGuiAttached(): void {
      this.place.closest('[role="dialog"]')?.setAttribute('aria-label', this.editor?.label ?? '')
      this.editor?.takeFocus()
    }

    getValue(): unknown {
      return this.editor?.getValue()
    }

    isPopup(): boolean {
      return this.editor?.isPopup() ?? false
    }

    getPopupPosition(): 'over' {
      return 'over'
    }

    destroy(): void {
      this.context?.editing.onStopped()
      render(null, this.place)
    }
  }
}
