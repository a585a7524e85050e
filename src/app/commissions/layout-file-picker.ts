import { Component, output, signal } from '@angular/core';
import { LAYOUT_TEXT_MOST, readLayoutText, type LayoutReading } from '@shared/layout/read-layout';

/** A file that was chosen, and the layout in it or what is wrong with it. */
export interface PickedLayout {
  readonly fileName: string;
  readonly reading: LayoutReading;
}

/** Four bytes a character is the most UTF-8 needs; more than that is not worth reading. */
const BYTES_MOST = 4 * LAYOUT_TEXT_MOST;

/** Takes a layout file, chosen or dropped, and reads it here: nothing is sent before it is sound. */
@Component({
  selector: 'sl-layout-file-picker',
  template: `
    <label
      [class.over]="over()"
      (dragover)="$event.preventDefault(); over.set(true)"
      (dragleave)="over.set(false)"
      (drop)="drop($event)"
    >
      <input
        #file
        type="file"
        accept=".json,application/json"
        class="cdk-visually-hidden"
        (change)="take(file.files?.item(0) ?? null); file.value = ''"
      />
      <b>Choose a layout file</b>
      <span>or drop it here</span>
    </label>
  `,
  styles: `
    label {
      display: grid;
      justify-items: center;
      gap: 2px;
      padding: 22px;
      border: 2px dashed var(--line-strong);
      border-radius: var(--radius);
      text-align: center;
      cursor: pointer;
    }
    label:hover,
    .over {
      border-color: var(--blue);
      background: var(--pale-blue);
    }
    label:focus-within {
      outline: 2px solid var(--blue);
      outline-offset: 2px;
    }
    b {
      color: var(--blue);
    }
    span {
      color: var(--mute);
    }
  `,
})
export class LayoutFilePicker {
  readonly picked = output<PickedLayout>();
  protected readonly over = signal(false);

  protected drop(event: DragEvent): void {
    event.preventDefault();
    this.over.set(false);
    void this.take(event.dataTransfer?.files.item(0) ?? null);
  }

  protected async take(file: File | null): Promise<void> {
    if (file !== null) this.picked.emit({ fileName: file.name, reading: await readFile(file) });
  }
}

async function readFile(file: File): Promise<LayoutReading> {
  if (file.size > BYTES_MOST) {
    return refused('The file is far larger than any layout, so it was not opened.');
  }
  try {
    return readLayoutText(await file.text());
  } catch {
    return refused('The file could not be read. Has it been moved or deleted?');
  }
}

function refused(message: string): LayoutReading {
  return { ok: false, problems: [{ field: 'file', message }] };
}
