import { Component, inject } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { Theme } from './platform/theme';

@Component({
  selector: 'sl-app',
  imports: [RouterOutlet],
  template: '<router-outlet />',
})
export class App {
  /** Made here so that the first page already has the colours that were chosen. */
  protected readonly theme = inject(Theme);
}
