import { Component, computed, input, signal } from '@angular/core';
import type { Layout } from '@shared/layout/schema';
import { runWords, tileRuns } from '@shared/layout/tile-runs';
import type { CutListRow } from '@shared/pieces/cut-list';
import { edgeWords } from '@shared/pieces/edge-words';
import { tileOutline } from '@shared/pieces/tile-outline';
import { formatLength, formatLengthFigure } from '@shared/units/format';
import type { Millimetres } from '@shared/units/length';
import { Icon } from '../../drawing/icon';
import { PieceDrawing } from '../../drawing/piece-drawing';
import { formatBoardLength } from './board-length';

/** One line of the cut list: a piece as it is drawn, how many, how large, and which tiles it fills. */
@Component({
  selector: 'sl-kind-row',
  imports: [Icon, PieceDrawing],
  templateUrl: './kind-row.html',
  styleUrl: './kind-row.scss',
})
export class KindRow {
  readonly layout = input.required<Layout>();
  readonly row = input.required<CutListRow>();
  /** How far every drawing of the list looks from its piece's centre. */
  readonly reach = input.required<Millimetres>();
  /** On paper the tiles are always shown. */
  readonly medium = input.required<'paper' | 'screen'>();

  protected readonly opened = signal<'open' | 'closed'>('closed');
  protected readonly tilesShown = computed(
    () => this.medium() === 'paper' || this.opened() === 'open',
  );
  protected readonly wood = computed(() => this.layout().woods[this.row().kind.wood]);
  protected readonly outline = computed(() => tileOutline(this.layout(), this.row().kind.edges));
  protected readonly edges = computed(() => edgeWords(this.row().kind.edges));
  protected readonly size = computed(() => {
    const { pieceLength, pieceWidth } = this.row();
    const unit = this.layout().lengthUnit;
    return `${formatLengthFigure(pieceLength, unit)} × ${formatLength(pieceWidth, unit)}`;
  });
  protected readonly board = computed(() =>
    formatBoardLength(this.row().boardLength, this.layout().lengthUnit),
  );
  protected readonly courses = computed(() =>
    tileRuns(this.layout().shell, this.row().kind.positions).map(({ course, runs }) => ({
      course,
      staves: runWords(runs),
    })),
  );
  /** How pieces of this kind go into the shell when they do not go in as drawn. */
  protected readonly turns = computed(() => {
    const { mirrored, faceDown, halfTurned } = this.row().kind;
    const down = tileRuns(this.layout().shell, faceDown).map(({ course }) => course);
    return [
      ...(mirrored ? ['Drawn as it lies on the machine, face down.'] : []),
      ...(down.length > 0
        ? [`${faceDown.length} lie face down when cut: ${courseWords(down)}.`]
        : []),
      ...(halfTurned.length > 0
        ? [`${halfTurned.length} go in after half a turn of the drawing.`]
        : []),
    ];
  });

  protected toggle(): void {
    this.opened.update((state) => (state === 'open' ? 'closed' : 'open'));
  }
}

function courseWords(courses: readonly string[]): string {
  return `${courses.length === 1 ? 'course' : 'courses'} ${courses.join(', ')}`;
}
