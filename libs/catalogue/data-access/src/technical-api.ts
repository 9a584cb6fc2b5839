import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import {
  getStaffSpecification,
  listVersions,
  withdrawSpecification,
  type StaffSpecification,
} from '@seamwright/catalogue/contracts';
import type { Answer } from '@seamwright/shared/contracts';
import { ApiClient } from '@seamwright/shared/data-access';

/** The technical pages' calls: each is asked once and kept by the page that asked. */
@Injectable({ providedIn: 'root' })
export class TechnicalApi {
  readonly #api = inject(ApiClient);

  /** A page of the newest versions, after the cursor of the page before. */
  list(query: { q?: string | undefined; cursor?: string | undefined }): Observable<Answer<typeof listVersions>> {
    return this.#api.call(listVersions, { query });
  }

  /** One version of a specification; without a number the one in force, else the newest. */
  record(code: string, version?: number): Observable<StaffSpecification> {
    return this.#api.call(getStaffSpecification, { params: { code }, query: { version } });
  }

  /** Takes the specification out of the catalogue. */
  withdraw({ code, rowVersion }: StaffSpecification, reason: string): Observable<StaffSpecification> {
    return this.#api.call(withdrawSpecification, { params: { code }, body: { reason }, ifMatch: rowVersion });
  }
}
