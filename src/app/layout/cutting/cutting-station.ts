import { ApplicationRef, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { boundsOf } from '@shared/geometry/outline';
import { cutList } from '@shared/pieces/cut-list';
import { edgesKey, tileOutline } from '@shared/pieces/tile-outline';
import { formatLength } from '@shared/units/format';
import { FigureText } from '../../drawing/figure-text';
import { Icon } from '../../drawing/icon';
import { WoodSwatch } from '../../drawing/wood-swatch';
import { LayoutStore } from '../layout-store';
import { BeforeCutting } from './before-cutting';
import { formatBoardLength } from './board-length';
import { BuildSettings } from './build-settings';
import { BundlePanel } from './bundle-panel';
import { KindRow } from './kind-row';
import { woodGroups } from './wood-groups';

/** The Cutting station: what to cut, from what, and the bundle for the machine. */
@Component({
  selector: 'sl-cutting-station',
  imports: [
    BeforeCutting,
    BuildSettings,
    BundlePanel,
    FigureText,
    Icon,
    KindRow,
    MatButton,
    WoodSwatch,
  ],
  templateUrl: './cutting-station.html',
  styleUrl: './cutting-station.scss',
  host: {
    '(window:beforeprint)': 'setPrinting("paper")',
    '(window:afterprint)': 'setPrinting("screen")',
  },
})
export class CuttingStation {
  protected readonly store = inject(LayoutStore);
  private readonly application = inject(ApplicationRef);

  /** What can be cut: the pattern on the last document that held together. */
  protected readonly layout = computed(() => {
    const [sound, cells] = [this.store.soundLayout(), this.store.cells()];
    return cells.length === sound.cells.length ? { ...sound, cells } : sound;
  });
  protected readonly list = computed(() => cutList(this.layout()));
  protected readonly groups = computed(() => {
    const layout = this.layout();
    const unit = layout.lengthUnit;
    return woodGroups(this.list(), layout.woods).map((group) => ({
      ...group,
      board: formatBoardLength(group.boardLength, unit),
      width: formatLength(group.widest, unit),
    }));
  });
  protected readonly summary = computed(() => {
    const { lengthUnit, shell } = this.layout();
    const { rows, tiles, spares, toCut } = this.list();
    const outlines = new Set(rows.map((row) => edgesKey(row.kind.edges))).size;
    const board = rows.reduce((sum, row) => sum + row.boardLength, 0);
    const woods = this.groups().length;
    return {
      toCut,
      tiles: `${counted(tiles, 'tile')} and ${counted(spares, 'spare')}`,
      board: formatBoardLength(board, lengthUnit),
      boardOf: `in one row, ${formatLength(shell.boardThickness, lengthUnit)} thick, grain along it`,
      kinds: rows.length,
      kindsOf: `${counted(outlines, 'outline')} in ${counted(woods, 'wood')}`,
    };
  });
  /** How far the farthest tab of any piece is from its centre: all drawings look that far. */
  protected readonly reach = computed(() =>
    Math.max(
      ...this.list().rows.flatMap(({ kind }) => {
        const { segments } = tileOutline(this.layout(), kind.edges);
        const { minX, minY, maxX, maxY } = boundsOf(segments);
        return [-minX, -minY, maxX, maxY];
      }),
    ),
  );
  protected readonly species = computed(() =>
    this.groups().flatMap(({ wood }) => wood.species ?? wood.name),
  );
  protected readonly printing = signal<'paper' | 'screen'>('screen');
  protected readonly printedOn = signal('');

  /** The paper shows every line in full; the browser prints as soon as the handler returns. */
  protected setPrinting(where: 'paper' | 'screen'): void {
    this.printedOn.set(new Date().toLocaleDateString('en-GB', { dateStyle: 'long' }));
    this.printing.set(where);
    this.application.tick();
  }

  protected print(): void {
    window.print();
  }
}

function counted(count: number, noun: string): string {
  return `${count} ${noun}${count === 1 ? '' : 's'}`;
}
