import { NgTemplateOutlet } from '@angular/common';
import { Component, computed, inject, viewChild, type ElementRef } from '@angular/core';
import { takeUntilDestroyed, toSignal } from '@angular/core/rxjs-interop';
import { NavigationEnd, Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import { distinctUntilChanged, filter, map, skip, startWith } from 'rxjs';
import { Icon } from '../drawing/icon';
import { ShellMark } from '../drawing/shell-mark';
import { BarSlot } from '../platform/bar-slot';
import { Connection } from '../platform/connection';
import { SessionStore } from '../platform/session-store';
import { AccountMenu } from './account-menu';

/** What stands around every page of someone signed in: bar, navigation, and the place for the page. */
@Component({
  selector: 'sl-frame',
  imports: [
    AccountMenu,
    Icon,
    NgTemplateOutlet,
    RouterLink,
    RouterLinkActive,
    RouterOutlet,
    ShellMark,
  ],
  templateUrl: './frame.html',
  styleUrl: './frame.scss',
  host: { '[class.wide]': 'wide()' },
})
export class Frame {
  private readonly router = inject(Router);
  protected readonly session = inject(SessionStore);
  protected readonly slot = inject(BarSlot);
  protected readonly connection = inject(Connection);
  private readonly page = viewChild.required<ElementRef<HTMLElement>>('page');

  private readonly arrived = this.router.events.pipe(
    filter((event) => event instanceof NavigationEnd),
  );
  private readonly route = toSignal(
    this.arrived.pipe(
      startWith(null),
      map(() => this.innermost()),
    ),
    { requireSync: true },
  );
  /** A page that uses the whole width stands without the side navigation. */
  protected readonly wide = computed(() => this.route()['wide'] === true);
  protected readonly places = computed(() =>
    this.session.may('see-commissions') ? [{ path: '/commissions', name: 'Commissions' }] : [],
  );

  constructor() {
    // After a step to another page the keyboard goes on from its top, as after a full load.
    this.arrived
      .pipe(
        map((event) => event.urlAfterRedirects.split(/[?#]/)[0]),
        distinctUntilChanged(),
        // The first page is where the browser starts anyway.
        skip(1),
        takeUntilDestroyed(),
      )
      .subscribe(() => this.toContent());
  }

  protected toContent(): void {
    this.page().nativeElement.focus({ preventScroll: true });
  }

  private innermost() {
    let route = this.router.routerState.snapshot.root;
    const data = { ...route.data };
    while (route.firstChild !== null) {
      route = route.firstChild;
      Object.assign(data, route.data);
    }
    return data;
  }
}
