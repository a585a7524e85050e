import { Component } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { ShellMark } from '../drawing/shell-mark';

@Component({
  selector: 'sl-frame',
  imports: [RouterOutlet, ShellMark],
  template: `<header><sl-shell-mark /> Staveloom</header>
    <main><router-outlet /></main>`,
})
export class Frame {}
