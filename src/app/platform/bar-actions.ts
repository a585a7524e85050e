import { Directive, inject, TemplateRef, type OnDestroy } from '@angular/core';
import { BarSlot } from './bar-slot';

/**
 * Puts a page's actions into the app bar for as long as the page lives:
 *
 *     <ng-template slBarActions><button matButton="filled">Keep as version 8</button></ng-template>
 */
@Directive({ selector: 'ng-template[slBarActions]' })
export class BarActions implements OnDestroy {
  private readonly slot = inject(BarSlot);
  private readonly template = inject<TemplateRef<unknown>>(TemplateRef);

  constructor() {
    this.slot.actions.set(this.template);
  }

  ngOnDestroy(): void {
    if (this.slot.actions() === this.template) this.slot.actions.set(null);
  }
}
