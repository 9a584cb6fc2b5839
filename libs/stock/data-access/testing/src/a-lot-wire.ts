import type { LotWire } from '@seamwright/stock/contracts';

/** A released lot as the server presents it; a test states only what it is about. */
export const aLotWire = (stated: Partial<LotWire> = {}): LotWire => ({
  id: '00000000-0000-7000-8000-000000000001',
  rowVersion: 3,
  code: 'L-100',
  nodeId: '00000000-0000-7000-8000-000000000002',
  nodeName: 'Shoulder',
  supplier: 'Test Farms',
  killDate: '2026-11-25',
  receivedOn: '2026-12-01',
  useBy: '2026-12-09',
  receivedGrams: 50_000,
  receivedPieces: 10,
  remainingGrams: 42_000,
  state: 'released',
  holdReason: null,
  origin: { bornIn: 'GB', rearedIn: 'GB', slaughteredIn: 'GB', slaughterhouse: 'UK 9999' },
  ...stated,
});
