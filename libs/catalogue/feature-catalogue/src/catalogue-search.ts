import { ChangeDetectionStrategy, Component, ElementRef, input, viewChild } from '@angular/core';
import { outputFromObservable, takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { Icon } from '@seamwright/shared/ui';
import { debounceTime, distinctUntilChanged, Subject } from 'rxjs';

const REST_MS = 250;

/** The catalogue's search field. `/` goes to it from anywhere on the page; it tells of words once typing rests. */
@Component({
  selector: 'sw-catalogue-search',
  imports: [Icon],
  template: `
    <label for="catalogue-words" class="cdk-visually-hidden" i18n="@@catalogue.search.label"
      >Search the catalogue</label
    >
    <sw-icon name="search" />
    <input
      #field
      id="catalogue-words"
      type="search"
      autocomplete="off"
      maxlength="100"
      placeholder="Cut, code or words"
      i18n-placeholder="@@catalogue.search.placeholder"
      aria-keyshortcuts="/"
      [value]="words()"
      (input)="typed.next(field.value.trim())"
    />
    <kbd aria-hidden="true">/</kbd>
  `,
  styleUrl: './catalogue-search.scss',
  host: { role: 'search', '(document:keydown)': 'onKey($event)' },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CatalogueSearch {
  readonly words = input.required<string>();

  protected readonly typed = new Subject<string>();
  readonly wordsChange = outputFromObservable(
    this.typed.pipe(debounceTime(REST_MS), distinctUntilChanged(), takeUntilDestroyed()),
  );

  private readonly field = viewChild.required<ElementRef<HTMLInputElement>>('field');

  protected onKey(event: KeyboardEvent): void {
    const writing = event.target instanceof HTMLElement && event.target.matches('input, textarea, select');
    if (event.key !== '/' || writing || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    this.field().nativeElement.focus();
  }
}
