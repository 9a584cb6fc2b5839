import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import { importBankStatement } from '@seamwright/accounts/contracts';
import { ApiClient, type UploadStep } from '@seamwright/shared/data-access';

/** Sends bank statements. A file is taken whole or not at all, and the same file once. */
@Injectable({ providedIn: 'root' })
export class BankStatements {
  readonly #api = inject(ApiClient);

  take(file: File, idempotencyKey: string): Observable<UploadStep<typeof importBankStatement>> {
    return this.#api.upload(importBankStatement, { file, idempotencyKey });
  }
}
