import {
  CellStyleModule,
  ClientSideRowModelApiModule,
  ClientSideRowModelModule,
  ColumnApiModule,
  CustomEditorModule,
  EventApiModule,
  ModuleRegistry,
  RenderApiModule,
  RowApiModule,
  RowStyleModule,
  ScrollApiModule,
} from 'ag-grid-community'

/** The parts of the grid that the estimate uses, one by one, so that the page doesn't carry the rest. */
export function registerGridModules(): void {
  ModuleRegistry.registerModules([
    CellStyleModule,
    ClientSideRowModelApiModule,
    ClientSideRowModelModule,
    ColumnApiModule,
    CustomEditorModule,
    EventApiModule,
    RenderApiModule,
    RowApiModule,
    RowStyleModule,
    ScrollApiModule,
  ])
}
