import { z } from 'zod'
import { idSchema } from '../../../shared/schemas/common.ts'
import { FileAnswer } from '../../http/answers.ts'
import { setEtag } from '../../http/etag.ts'
import { operation, type Operation } from '../../http/operation.ts'
import type { WorkbookService } from './workbookService.ts'

const XLSX = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet'

export function workbookOperations({ workbooks }: { workbooks: WorkbookService }): Operation[] {
  return [
    operation(
      {
        id: 'downloadWorkbook',
        method: 'get',
        path: '/estimates/:id/workbook',
        action: 'workbook.download',
        summary: 'An estimate as an .xlsx workbook with live formulas: summary, lines, rooms, prices, assumptions and cautions.',
        produces: XLSX,
        params: z.object({ id: idSchema }),
      },
      async ({ user, params, res }) => {
        const { content, fileName, version } = await workbooks.make(user, params.id)
        setEtag(res, version)
        return new FileAnswer(content, XLSX, fileName)
      },
    ),
  ]
}
