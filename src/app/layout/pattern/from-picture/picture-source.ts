import type { ElementRef } from '@angular/core';
import { Component, output, signal, viewChild } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { PICTURE_TYPES } from '@shared/api/picture';

/** Where a picture comes in: chosen, dropped or pasted. */
@Component({
  selector: 'sl-picture-source',
  imports: [MatButton],
  host: {
    '[class.over]': 'over()',
    '(dragover)': 'drag($event)',
    '(dragleave)': 'over.set(false)',
    '(drop)': 'drop($event)',
    '(document:paste)': 'paste($event)',
  },
  template: `
    <p><ng-content /></p>
    <button matButton="outlined" type="button" (click)="choose()">Choose a picture</button>
    <input
      #chooser
      type="file"
      hidden
      aria-label="A picture to lay"
      [accept]="types"
      (change)="chosen()"
    />
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      align-items: center;
      gap: 8px 16px;
      padding: 12px 16px;
      border: 2px dashed var(--line-strong);
      border-radius: var(--radius-large);
    }
    :host.over {
      border-color: var(--blue);
      background: var(--pale-blue);
    }
    p {
      flex: 1 1 220px;
      margin: 0;
      color: var(--mute);
      font-size: 14px;
      line-height: 1.45;
    }
  `,
})
export class PictureSource {
  readonly found = output<File>();
  protected readonly types = PICTURE_TYPES.join(',');
  protected readonly over = signal(false);
  private readonly chooser = viewChild.required<ElementRef<HTMLInputElement>>('chooser');

  protected choose(): void {
    this.chooser().nativeElement.click();
  }

  protected chosen(): void {
    const chooser = this.chooser().nativeElement;
    this.take(chooser.files);
    // or else the same file could not be chosen again after a refusal
    chooser.value = '';
  }

  protected drag(event: DragEvent): void {
    event.preventDefault();
    this.over.set(true);
  }

  protected drop(event: DragEvent): void {
    event.preventDefault();
    this.over.set(false);
    this.take(event.dataTransfer?.files);
  }

  protected paste(event: ClipboardEvent): void {
    this.take(event.clipboardData?.files);
  }

  private take(files: FileList | null | undefined): void {
    const file = files?.[0];
    if (file) this.found.emit(file);
  }
}
