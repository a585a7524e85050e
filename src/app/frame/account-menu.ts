import { A11yModule } from '@angular/cdk/a11y';
import { OverlayModule, type ConnectedPosition } from '@angular/cdk/overlay';
import { Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import { Avatar, initialsOf } from '../drawing/avatar';
import { ChoiceBar, type Choice } from '../drawing/choice-bar';
import { Icon } from '../drawing/icon';
import { Announcer } from '../platform/announcer';
import { apiFailureOf } from '../platform/api-problem';
import { SessionStore } from '../platform/session-store';
import { Theme, type ThemeName } from '../platform/theme';

/** Who is signed in, as what, in which workshop; colours; sign out. */
@Component({
  selector: 'sl-account-menu',
  imports: [A11yModule, Avatar, ChoiceBar, Icon, MatButton, OverlayModule],
  templateUrl: './account-menu.html',
  styleUrl: './account-menu.scss',
})
export class AccountMenu {
  private readonly router = inject(Router);
  private readonly announcer = inject(Announcer);
  private readonly session = inject(SessionStore);
  protected readonly theme = inject(Theme);
  protected readonly person = this.session.person;
  protected readonly roles = computed(() => this.session.roles().join(', '));
  protected readonly initials = computed(() => initialsOf(this.person()?.name ?? ''));
  protected readonly opened = signal(false);
  protected readonly below: ConnectedPosition[] = [
    { originX: 'end', originY: 'bottom', overlayX: 'end', overlayY: 'top', offsetY: 8 },
  ];
  protected readonly themes: readonly Choice<ThemeName>[] = [
    { value: 'system', label: 'System' },
    { value: 'light', label: 'Light' },
    { value: 'dark', label: 'Dark' },
  ];

  protected async signOut(): Promise<void> {
    try {
      await this.session.signOut();
    } catch (thrown) {
      this.announcer.tell(`You are still signed in. ${apiFailureOf(thrown).message}`);
      return;
    }
    this.opened.set(false);
    await this.router.navigateByUrl('/sign-in');
  }
}
