import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import {
  getImportTemplate,
  getOrderImport,
  takeOrders,
  uploadOrders,
  type OrderImportWire,
} from '@seamwright/ordering/contracts';
import { ApiClient, type FileDownload, type UploadStep } from '@seamwright/shared/data-access';

/** Orders from a workbook: looked at first, then taken once. The same key makes the same deed. */
@Injectable({ providedIn: 'root' })
export class OrderImports {
  readonly #api = inject(ApiClient);

  template(): Observable<FileDownload> {
    return this.#api.download(getImportTemplate, {});
  }

  /** Tells how much of the file is sent; what was read of it comes with the last step. */
  upload(file: File, idempotencyKey: string): Observable<UploadStep<typeof uploadOrders>> {
    return this.#api.upload(uploadOrders, { file, idempotencyKey });
  }

  read(importId: string): Observable<OrderImportWire> {
    return this.#api.call(getOrderImport, { params: { importId } });
  }

  take(importId: string, how: 'good-rows' | 'all-or-none', idempotencyKey: string): Observable<OrderImportWire> {
    return this.#api.call(takeOrders, { params: { importId }, body: { how }, idempotencyKey });
  }
}
