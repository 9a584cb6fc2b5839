import { createHash } from 'node:crypto';
import type { OrderImportWire } from '@seamwright/ordering/contracts';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { sayRefusal } from '@seamwright/shared/contracts';
import { conflict, personOf, type Tx, type UploadedFile } from '@seamwright/shared/server';
import { newId, RefusalError } from '@seamwright/shared/util';
import {
  importById,
  insertImport,
  markTaken,
  sameFileTakenAt,
  type KeptRows,
  type ShownOrder,
} from './order-imports.repository';
import { ordersByIds } from './orders.repository';
import type { OrderingParts } from './ports';
import type { Preparing } from './prepare-orders';
import { previewImport, type ImportableOrder, type ImportPreview } from './preview-import';
import { readOrderWorkbook } from './read-order-workbook';
import { storeOrders } from './store-orders';

type Parts = Pick<OrderingParts, 'timeZone' | 'days'>;

/** Reads a workbook and keeps its rows with what would become of them; places nothing. Gives the import's id. */
export async function uploadImport(tx: Tx, by: Preparing, parts: Parts, file: UploadedFile): Promise<string> {
  const uploadedBy = personOf(by.caller);
  if (uploadedBy === null) throw new RefusalError({ code: 'not-allowed', params: {} });
  const read = await readOrderWorkbook(file.bytes);
  const preview = await previewImport(tx, by, parts, read);
  const id = newId<'OrderImport'>();
  await insertImport(tx, {
    id,
    fileName: file.fileName.slice(0, 200),
    fileHash: createHash('sha256').update(file.bytes).digest('hex'),
    kept: { ...read, shown: shownOf(preview) },
    uploadedBy,
    uploadedAt: by.now,
  });
  return id;
}

/**
 * Places the orders of a workbook, once, as they stand now. Refuses `import-taken-already`, `import-has-faults` (count)
 * when all or none was asked for, and `import-nothing-good`.
 */
export async function takeImport(
  tx: Tx,
  by: Preparing,
  parts: Parts,
  { importId, how }: { readonly importId: string; readonly how: 'good-rows' | 'all-or-none' },
): Promise<string> {
  const kept = await importById(tx, importId, true);
  if (kept.taken) throw conflict('import-taken-already');
  const preview = await previewImport(tx, by, parts, kept.kept);
  if (how === 'all-or-none' && preview.faults.length > 0)
    throw conflict('import-has-faults', { count: preview.faults.length });
  if (preview.orders.length === 0) throw conflict('import-nothing-good');
  const orderIds = await storeOrders(
    tx,
    by,
    preview.orders.map(({ imported, site, prepared }) => ({
      customerId: site.customerId,
      siteId: site.siteId,
      deliveryDay: imported.day,
      source: 'import' as const,
      settlement: 'account' as const,
      customerReference: '',
      note: '',
      prepared,
    })),
  );
  await markTaken(tx, importId, {
    how,
    at: by.now,
    orderIds,
    kept: { ...kept.kept, shown: shownOf(preview) },
  });
  return importId;
}

const shownOf = ({ orders, faults }: ImportPreview): KeptRows['shown'] => ({ orders: orders.map(shownOrder), faults });

function shownOrder({ imported, site, prepared }: ImportableOrder): ShownOrder {
  return {
    customer: site.customerName,
    site: site.siteName,
    deliveryDay: imported.day,
    estimateMinor: prepared.totals.estimate.totalMinor,
    maxMinor: prepared.totals.max.totalMinor,
    lines: prepared.lines.map(({ index, resolved, weights, estimateMinor }) => ({
      row: imported.lines[index]?.row ?? 0,
      code: resolved.version.code,
      name: resolved.version.name,
      summary: resolved.summary,
      pieces: weights.pieces,
      estimateGrams: weights.estimateGrams,
      estimateMinor,
    })),
  };
}

/** The import as it stands: what was seen of it last, and the orders it became. Throws `not-found`. */
export async function presentImport(tx: Tx, id: string): Promise<OrderImportWire> {
  const row = await importById(tx, id);
  const { orders, faults } = row.kept.shown;
  const placed = await ordersByIds(tx, row.orderIds);
  const before = row.taken ? null : await sameFileTakenAt(tx, row.fileHash, id);
  return {
    id,
    rowVersion: row.rowVersion,
    fileName: row.fileName,
    uploadedAt: row.uploadedAt.toISOString(),
    currency: HOUSE_CURRENCY,
    rows: row.kept.rows.length + new Set(row.kept.faults.map((fault) => fault.row)).size,
    orders: orders.map((order) => ({ ...order, lines: [...order.lines] })),
    faults: faults.map(({ row: at, column, code, params }) => ({
      row: at,
      column,
      code,
      message: sayRefusal({ code, params }),
    })),
    sameFileTakenAt: before?.toISOString() ?? null,
    taken: row.taken as OrderImportWire['taken'],
    takenAt: row.takenAt?.toISOString() ?? null,
    placed: placed.map((order) => ({
      id: order.id,
      number: order.number,
      customer: order.customerName,
      deliveryDay: order.deliveryDay,
    })),
  };
}
