import { z } from 'zod'
import { ROOM_CORNERS_MAX, type Ceiling, type Shape } from '../../schemas/room.ts'
import { checkShape } from '../geometry/checkShape.ts'
import { lengthField, placeField } from './documentFields.ts'
import { noSuch } from './noSuch.ts'

const rectangleDocument = z.strictObject({ kind: z.literal('rectangle'), length: lengthField, width: lengthField })
const ellDocument = z.strictObject({
  kind: z.literal('ell'),
  length: lengthField,
  width: lengthField,
  cutLength: lengthField,
  cutWidth: lengthField,
})
const polygonDocument = z.strictObject({
  kind: z.literal('polygon'),
  corners: z
    .array(z.tuple([placeField, placeField]))
    .min(3, 'needs at least three corners')
    .max(ROOM_CORNERS_MAX),
})

/** A plan. What is no plan is refused at the field that is at fault. */
export const shapeDocument = z
  .discriminatedUnion('kind', [rectangleDocument, ellDocument, polygonDocument], { error: noSuch('kind', 'rectangle, ell, polygon') })
  .transform((keyed, context): Shape => {
    const shape = toShape(keyed)
    for (const { path, code, message } of checkShape(shape)) {
      context.addIssue({ code: 'custom', path: pathInDocument(path), message, params: { code } })
    }
    return shape
  })

type KeyedShape = z.output<typeof rectangleDocument> | z.output<typeof ellDocument> | z.output<typeof polygonDocument>

function toShape(keyed: KeyedShape): Shape {
  if (keyed.kind === 'polygon') return keyed
  const { kind, length: lengthIn, width: widthIn } = keyed
  if (kind === 'rectangle') return { kind, lengthIn, widthIn }
  return { kind, lengthIn, widthIn, cutLengthIn: keyed.cutLength, cutWidthIn: keyed.cutWidth }
}

/** `cutLengthIn` → `cutLength`; `corners[2]` → `corners`, 2. */
function pathInDocument(path: string): (string | number)[] {
  const corner = /^corners\[(\d+)\]$/.exec(path)
  return corner ? ['corners', Number(corner[1])] : [path.replace(/In$/, '')]
}

export const ceilingDocument = z
  .discriminatedUnion(
    'kind',
    [
      z.strictObject({ kind: z.literal('flat'), height: lengthField }),
      z.strictObject({ kind: z.literal('sloped'), low: lengthField, high: lengthField }),
    ],
    { error: noSuch('kind', 'flat, sloped') },
  )
  .transform((keyed, context): Ceiling => {
    if (keyed.kind === 'flat') return { kind: 'flat', heightIn: keyed.height }
    if (keyed.high < keyed.low)
      context.addIssue({ code: 'custom', path: ['high'], message: 'must not be below low', params: { code: 'out-of-order' } })
    return { kind: 'sloped', lowIn: keyed.low, highIn: keyed.high }
  })
