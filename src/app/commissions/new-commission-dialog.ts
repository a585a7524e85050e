import { Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import type { Commission, NewCommission } from '@shared/api/commission';
import { layoutFileOf } from '@shared/layout/read-layout';
import type { Layout } from '@shared/layout/schema';
import { startingLayout } from '@shared/layout/starting-layout';
import { thumbnailOf } from '@shared/layout/thumbnail';
import { formatLengthFigure } from '@shared/units/format';
import { ChoiceBar, type Choice } from '../drawing/choice-bar';
import { ProblemList } from '../drawing/problem-list';
import { ShellThumbnail } from '../drawing/shell-thumbnail';
import { apiFailureOf, type ApiFailure } from '../platform/api-problem';
import { CommissionFields, commissionForm, commissionIn } from './commission-fields';
import { shellWords } from './commission-words';
import { LayoutFilePicker, type PickedLayout } from './layout-file-picker';

type Start = 'plain' | 'file';

/** Asks for what a new commission needs; closes with the commission once the server has it. */
@Component({
  selector: 'sl-new-commission-dialog',
  imports: [
    ChoiceBar,
    CommissionFields,
    LayoutFilePicker,
    MatButton,
    MatDialogModule,
    ProblemList,
    ShellThumbnail,
  ],
  templateUrl: './new-commission-dialog.html',
  styleUrl: './new-commission-dialog.scss',
})
export class NewCommissionDialog {
  private readonly create =
    inject<(commission: NewCommission) => Promise<Commission>>(MAT_DIALOG_DATA);
  private readonly dialog = inject<MatDialogRef<NewCommissionDialog, Commission>>(MatDialogRef);

  protected readonly starts: readonly Choice<Start>[] = [
    { value: 'plain', label: 'A plain shell' },
    { value: 'file', label: 'A layout file' },
  ];
  protected readonly start = signal<Start>('plain');
  protected readonly form = commissionForm({ title: '', client: null, due: null });
  protected readonly waiting = signal(false);
  protected readonly failure = signal<ApiFailure | null>(null);
  protected readonly fileMissing = signal(false);
  protected readonly picked = signal<PickedLayout | null>(null);

  protected readonly plain = sampleOf(startingLayout('Plain shell'));
  protected readonly opened = computed(() => {
    const reading = this.picked()?.reading;
    return reading?.ok === true ? sampleOf(reading.layout) : null;
  });
  protected readonly problems = computed(() => {
    const reading = this.picked()?.reading;
    return reading?.ok === false ? reading.problems : [];
  });

  protected choose(start: Start): void {
    this.start.set(start);
    this.fileMissing.set(false);
  }

  protected take(picked: PickedLayout): void {
    this.picked.set(picked);
    this.fileMissing.set(false);
    const { title } = this.form.controls;
    if (picked.reading.ok && title.value.trim() === '') title.setValue(picked.reading.layout.name);
  }

  protected async save(submitted: Event): Promise<void> {
    submitted.preventDefault();
    this.form.markAllAsTouched();
    const layout = this.start() === 'file' ? this.opened()?.layout : undefined;
    this.fileMissing.set(this.start() === 'file' && layout === undefined);
    if (this.form.invalid || this.fileMissing() || this.waiting()) return;
    this.waiting.set(true);
    this.failure.set(null);
    try {
      const file = layout === undefined ? {} : { layout: layoutFileOf(layout) };
      this.dialog.close(await this.create({ ...commissionIn(this.form), ...file }));
    } catch (thrown) {
      this.failure.set(apiFailureOf(thrown));
    } finally {
      this.waiting.set(false);
    }
  }
}

/** What is shown of a layout before a commission is made from it. */
function sampleOf(layout: Layout) {
  const { staves, courses, tileWidth, tileHeight } = layout.shell;
  const woods = layout.woods.map((wood) => wood.name);
  const tile = [tileWidth, tileHeight].map((side) => formatLengthFigure(side, layout.lengthUnit));
  return {
    layout,
    name: layout.name,
    thumbnail: thumbnailOf(layout),
    words: `${shellWords({ staves, courses, woods })}; tiles ${tile.join(' × ')} ${layout.lengthUnit}`,
  };
}
