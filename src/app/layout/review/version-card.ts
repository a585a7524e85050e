import { Component, computed, inject, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Version } from '@shared/api/version';
import { Icon } from '../../drawing/icon';
import { ShellThumbnail } from '../../drawing/shell-thumbnail';
import { LayoutStore } from '../layout-store';
import { versionFilePath } from '../versions-api';
import type { Pair } from './pair';

const WHEN = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeStyle: 'short' });

/** A kept version: its picture, who kept it when and why, and what can be done with it. */
@Component({
  selector: 'sl-version-card',
  imports: [Icon, MatButton, ShellThumbnail],
  template: `
    <article class="card" [attr.aria-label]="'Version ' + version().number">
      <div class="head">
        <sl-shell-thumbnail [thumbnail]="version().thumbnail" />
        <div>
          <h2>Version {{ version().number }}</h2>
          <p class="mute">{{ version().keptBy }}, {{ when() }}</p>
          @if (version().restoredFrom; as number) {
            <p class="mute">Version {{ number }} again</p>
          }
        </div>
      </div>
      @if (version().note !== '') {
        <p class="note">{{ version().note }}</p>
      }
      <div class="steps">
        @if (previous(); as number) {
          <button
            matButton
            type="button"
            [attr.aria-label]="'What changed in version ' + version().number"
            (click)="compared.emit({ before: number, after: version().number })"
          >
            <sl-icon matButtonIcon name="compare" /> What changed
          </button>
        }
        @if (store.rights.keepVersions()) {
          <button
            matButton
            type="button"
            [attr.aria-label]="'Restore version ' + version().number"
            (click)="restored.emit()"
          >
            <sl-icon matButtonIcon name="restore" /> Restore
          </button>
        }
        <a
          matButton
          download
          [href]="file()"
          [attr.aria-label]="'Layout file of version ' + version().number"
        >
          <sl-icon matButtonIcon name="download" /> Layout file
        </a>
      </div>
    </article>
  `,
  styleUrl: './version-card.scss',
})
export class VersionCard {
  protected readonly store = inject(LayoutStore);

  readonly version = input.required<Version>();
  /** The version kept before it, or null for the first. */
  readonly previous = input.required<number | null>();
  readonly compared = output<Pair>();
  readonly restored = output();

  protected readonly when = computed(() => WHEN.format(new Date(this.version().keptAt)));
  protected readonly file = computed(() =>
    versionFilePath(this.store.opened()?.id ?? '', this.version().number),
  );
}
