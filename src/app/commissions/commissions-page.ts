import { Component } from '@angular/core';

@Component({
  selector: 'sl-commissions-page',
  template: '<h1 class="page-title">Commissions</h1>',
})
export class CommissionsPage {}
