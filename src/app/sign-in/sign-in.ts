import { Component } from '@angular/core';

@Component({
  selector: 'sl-sign-in',
  template: '<main><h1 class="page-title">Sign in</h1></main>',
})
export class SignIn {}
