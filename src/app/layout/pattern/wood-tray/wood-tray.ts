import { Component, computed, inject, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';
import { countWoods } from '@shared/layout/cells';
import type { Wood } from '@shared/layout/schema';
import { hasRoomForWood } from '@shared/layout/wood-changes';
import { Icon } from '../../../drawing/icon';
import { LayoutStore } from '../../layout-store';
import { figuresOf, type WoodFigure } from '../grain/wood-figure';
import { PatternTool } from '../pattern-tool';
import { tilesWords } from '../sentence-words';
import { shareWords } from './share-words';
import { WoodStrip } from './wood-strip';

export interface TrayWood {
  readonly index: number;
  readonly wood: Wood;
  readonly figure: WoodFigure;
  readonly tiles: string;
  readonly share: string;
}

/** The woods along the bottom, each as a strip of itself: pressing one takes it into the hand. */
@Component({
  selector: 'sl-wood-tray',
  imports: [Icon, MatButton, MatMenuModule, WoodStrip],
  templateUrl: './wood-tray.html',
  styleUrl: './wood-tray.scss',
})
export class WoodTray {
  protected readonly store = inject(LayoutStore);
  protected readonly tool = inject(PatternTool);

  readonly mode = input.required<'lay' | 'look'>();
  readonly added = output();
  readonly edited = output<number>();
  readonly removed = output<number>();

  protected readonly room = computed(() => hasRoomForWood(this.store.layout()));
  protected readonly woods = computed<TrayWood[]>(() => {
    const woods = this.store.woods();
    const figures = figuresOf(woods);
    const counts = countWoods(this.store.cells(), woods.length);
    return woods.map((wood, index) => ({
      index,
      wood,
      figure: figures[index] ?? { mark: 'plain', density: 2 },
      tiles: tilesWords(counts[index] ?? 0),
      share: shareWords(counts[index] ?? 0, this.store.cells().length),
    }));
  });
}
