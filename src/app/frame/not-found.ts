import { Component } from '@angular/core';
import { RouterLink } from '@angular/router';
import { MatButton } from '@angular/material/button';
import { EmptyPlace } from '../drawing/empty-place';

@Component({
  selector: 'sl-not-found',
  imports: [EmptyPlace, MatButton, RouterLink],
  template: `
    <sl-empty-place
      [level]="1"
      heading="There is nothing at this address"
      text="It may have been moved, or it belongs to another workshop."
    >
      <a matButton="filled" routerLink="/">Go to the start page</a>
    </sl-empty-place>
  `,
})
export class NotFound {}
