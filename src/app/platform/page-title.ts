import { inject, Injectable } from '@angular/core';
import { Title } from '@angular/platform-browser';
import { TitleStrategy, type RouterStateSnapshot } from '@angular/router';

/** Names the browser's tab "Commissions · Staveloom". */
@Injectable({ providedIn: 'root' })
export class PageTitle extends TitleStrategy {
  private readonly title = inject(Title);

  override updateTitle(state: RouterStateSnapshot): void {
    this.name(this.buildTitle(state));
  }

  /** Names the page by hand, for a page whose name is only known once it is loaded. */
  name(page: string | undefined): void {
    this.title.setTitle(page === undefined ? 'Staveloom' : `${page} · Staveloom`);
  }
}
