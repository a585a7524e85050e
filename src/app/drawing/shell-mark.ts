import { Component, input } from '@angular/core';

const WEDGES = 12;
const OUTER = 15;
const INNER = 8;

/** Corner of a ring of radius `radius` at `turn` (share of the whole circle), clockwise from the top. */
function corner(radius: number, turn: number): string {
  const angle = turn * 2 * Math.PI;
  return `${(16 + radius * Math.sin(angle)).toFixed(2)} ${(16 - radius * Math.cos(angle)).toFixed(2)}`;
}

function wedge(index: number): string {
  const from = (index - 0.5) / WEDGES;
  const to = (index + 0.5) / WEDGES;
  return (
    `M${corner(OUTER, from)}A${OUTER} ${OUTER} 0 0 1 ${corner(OUTER, to)}` +
    `L${corner(INNER, to)}A${INNER} ${INNER} 0 0 0 ${corner(INNER, from)}Z`
  );
}

/** The mark: a ring of alternating wedges. Decoration only; the name stands beside it. */
@Component({
  selector: 'sl-shell-mark',
  template: `
    <svg
      viewBox="0 0 32 32"
      aria-hidden="true"
      focusable="false"
      [class.faint]="tone() === 'faint'"
    >
      @for (path of wedges; track $index) {
        <path [attr.d]="path" [class.pale]="$odd" />
      }
    </svg>
  `,
  styles: `
    :host {
      display: inline-block;
      width: 30px;
      height: 30px;
    }
    svg {
      display: block;
      width: 100%;
      height: 100%;
    }
    path {
      fill: var(--mark-dark);
    }
    .pale {
      fill: var(--mark-pale);
    }
    .faint path {
      fill: var(--line);
    }
    .faint .pale {
      fill: var(--pale-blue);
    }
  `,
})
export class ShellMark {
  readonly tone = input<'full' | 'faint'>('full');
  protected readonly wedges = Array.from({ length: WEDGES }, (_, index) => wedge(index));
}
