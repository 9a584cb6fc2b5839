import { Directive, inject, input, TemplateRef } from '@angular/core';

/** Draws the cells of the column whose key it names: `<ng-template swCell="state" let-row>`. */
@Directive({ selector: 'ng-template[swCell]' })
export class TableCell<Row = unknown> {
  readonly swCell = input.required<string>();
  readonly template = inject<TemplateRef<{ $implicit: Row }>>(TemplateRef);
}
