import { DestroyRef, inject, Injectable, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import type { Observable } from 'rxjs';
import type { Problem } from '@seamwright/shared/contracts';
import { asProblem } from '@seamwright/shared/data-access';
import { newId } from '@seamwright/shared/util';
import type { SiteFacts, SiteView } from '@seamwright/identity/contracts';
import { CustomersApi } from './customers.api';

/**
 * A customer's sites and the one of them that is being added or changed; provided by the page that shows them. When
 * somebody else saved first, the newer state is offered, and what was typed stays.
 */
@Injectable()
export class SitesEditor {
  readonly #api = inject(CustomersApi);
  readonly #destroyed = inject(DestroyRef);
  #customerId = '';
  #key = newId();
  #rowVersion = 0;
  readonly #sites = signal<readonly SiteView[] | null>(null);
  readonly #problem = signal<Problem | null>(null);
  readonly #editing = signal<SiteView | 'new' | null>(null);
  readonly #saving = signal(false);
  readonly #refused = signal<Problem | null>(null);
  readonly #newer = signal<{ readonly read: SiteView; readonly now: SiteView } | null>(null);
  readonly #done = signal<{ readonly name: string } | null>(null);

  readonly sites = this.#sites.asReadonly();
  readonly problem = this.#problem.asReadonly();
  readonly editing = this.#editing.asReadonly();
  readonly saving = this.#saving.asReadonly();
  readonly refused = this.#refused.asReadonly();
  readonly newer = this.#newer.asReadonly();
  readonly done = this.#done.asReadonly();

  open(customerId: string): void {
    this.#customerId = customerId;
    this.load();
  }

  load(): void {
    this.#problem.set(null);
    this.#while(this.#api.sites(this.#customerId)).subscribe({
      next: (sites) => this.#sites.set(sites),
      error: (error: unknown) => this.#problem.set(asProblem(error)),
    });
  }

  begin(site: SiteView | 'new'): void {
    this.#key = newId();
    this.#rowVersion = site === 'new' ? 0 : site.rowVersion;
    this.#refused.set(null);
    this.#newer.set(null);
    this.#editing.set(site);
  }

  leave(): void {
    this.#editing.set(null);
    this.#refused.set(null);
    this.#newer.set(null);
  }

  save({ active, ...facts }: SiteFacts & { readonly active: boolean }): void {
    const site = this.#editing();
    if (site === null) return;
    this.#saving.set(true);
    this.#refused.set(null);
    const saving =
      site === 'new'
        ? this.#api.addSite(this.#customerId, facts, this.#key)
        : this.#api.updateSite({ ...site, rowVersion: this.#rowVersion }, { ...facts, active });
    this.#while(saving).subscribe({
      next: ({ name }) => {
        this.#saving.set(false);
        this.leave();
        this.#done.set({ name });
        this.load();
      },
      error: (error: unknown) => this.#keep(site, asProblem(error)),
    });
  }

  takeNewer(): void {
    const newer = this.#newer();
    if (newer) this.begin(newer.now);
  }

  keepMine(): void {
    this.#newer.set(null);
  }

  #keep(site: SiteView | 'new', problem: Problem): void {
    this.#saving.set(false);
    // What was refused was not stored, and may be sent changed; a lost answer is asked for again by the same key.
    if (problem.status >= 400 && problem.status < 500) this.#key = newId();
    if (site === 'new' || problem.code !== 'stale') return this.#refused.set(problem);
    this.#while(this.#api.sites(this.#customerId)).subscribe({
      next: (sites) => {
        const now = sites.find(({ id }) => id === site.id);
        if (!now) return this.#refused.set(problem);
        this.#rowVersion = now.rowVersion;
        this.#newer.set({ read: site, now });
      },
      error: (error: unknown) => this.#refused.set(asProblem(error)),
    });
  }

  #while<T>(call: Observable<T>): Observable<T> {
    return call.pipe(takeUntilDestroyed(this.#destroyed));
  }
}
