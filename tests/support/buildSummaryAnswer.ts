import type { EstimateSummary } from '../../shared/schemas/estimateSummary.ts'

function range(likely: number) {
  return { low: Math.round(likely * 0.8), likely, high: Math.round(likely * 1.3) }
}

/** What the server tells an owner of a small estimate; say what matters to the test. */
export function buildSummaryAnswer(own: Partial<EstimateSummary> = {}): EstimateSummary {
  return {
    estimateId: 'e1',
    estimateVersion: 4,
    house: { id: 'h1', name: '14 Lantern Street', address: '', regionName: 'Merrow Harbor', yearBuilt: 1926, storeys: 1, kind: 'detached' },
    priceBookVersion: 2,
    priceBookDate: '2026-01-15',
    totals: {
      directCents: range(5_000_000),
      overheadAndProfitCents: range(690_000),
      salesTaxCents: range(118_000),
      permitsCents: range(98_000),
      contingencyCents: range(514_000),
      totalCents: { low: 5_130_000, likely: 6_420_000, high: 8_390_000 },
    },
    bySystem: [{ key: 'roof', title: 'Roof covering, flashing, gutters', amountCents: range(1_140_000), hours: 0, lineCount: 3 }],
    byRoom: [{ key: 'r1', title: 'Kitchen', amountCents: range(1_090_000), hours: 20, lineCount: 9 }],
    byTrade: [{ key: 'roofing', title: 'Roofing', amountCents: range(1_140_000), hours: 0, lineCount: 3 }],
    ownHandsCents: range(824_000),
    hiredCents: range(4_176_000),
    ownHandsHours: 191.4,
    evidence: [
      { mark: 'seen', likelyCents: 2_100_000, sharePercent: 42, lineCount: 30 },
      { mark: 'measured', likelyCents: 2_900_000, sharePercent: 58, lineCount: 40 },
      { mark: 'tested', likelyCents: 0, sharePercent: 0, lineCount: 0 },
      { mark: 'bid', likelyCents: 0, sharePercent: 0, lineCount: 0 },
    ],
    lineCount: 70,
    errorCount: 0,
    unknowns: [{ description: 'Rot under the tub', systemTitle: 'Floor structure', chancePercent: 45, costCents: range(220_000) }],
    cautions: [{ key: 'lead', title: 'Lead paint is presumed here', text: 'Leave it.', source: '40 CFR part 745' }],
    notIssuedNotice: 'This is a working estimate. It has not been issued.',
    notices: ['An estimate is not an inspection, an appraisal or an offer of credit.'],
    sharedBy: null,
    ...own,
  }
}
