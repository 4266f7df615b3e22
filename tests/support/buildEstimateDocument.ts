import type { EstimateDocument } from '../../shared/engine/index.ts'

/** A document of one room and one line, as short as one can be. Change what matters. */
export function buildEstimateDocument(own: Partial<EstimateDocument> = {}): EstimateDocument {
  return {
    format: 'quoinbook.estimate',
    version: 1,
    house: { name: '14 Lantern Street' },
    rooms: [{ key: 'bed-1', name: 'Front bedroom', shape: { kind: 'rectangle', length: `12' 6"`, width: `10'` } }],
    lines: [
      {
        key: 'plank',
        room: 'bed-1',
        system: 'floors',
        description: 'Vinyl plank, floating',
        unit: 'sf',
        quantity: 'floor_area',
        basis: 'own-hands',
        unitPrice: { low: '2.40', likely: '3.00', high: '3.90' },
      },
    ],
    ...own,
  }
}
