/**
 * The numbered map for assembly: the unrolled shell as seen from outside, one user unit a millimetre, every
 * tile with its outline before clearance, so that neighbours share their edges.
 */
import { courseLetters } from '@shared/layout/cells';
import type { Layout } from '@shared/layout/schema';
import type { PieceKind } from '@shared/pieces/piece-kind';
import { trimOf } from '@shared/shell/trim';
import type { LengthUnit } from '@shared/units/length';
import { patternLegend } from './pattern-legend';
import { mapSize, type MapSize } from './pattern-map';
import { patternDecimal as decimal, SEAM_COLOUR, TRIM_COLOUR } from './pattern-marks';
import { drawTiles } from './pattern-tiles';
import { element, textElement, xmlFile, type Markup } from './xml';

/** The map of a layout; its lengths are said in the given unit. */
export function patternSvg(layout: Layout, kinds: readonly PieceKind[], unit: LengthUnit): string {
  const map = mapSize(layout);
  const legend = patternLegend(layout, kinds, map.letter, unit);
  const width = Math.max(map.width + 2 * map.margin, legend.width + map.margin);
  const height = map.height + 2 * map.margin + legend.height;
  const { definitions, courses } = drawTiles(layout, kinds, map);
  const box = [-map.margin, -map.height - map.margin, width, height].map(decimal).join(' ');
  return xmlFile(
    element(
      'svg',
      {
        xmlns: 'http://www.w3.org/2000/svg',
        width: `${decimal(width)}mm`,
        height: `${decimal(height)}mm`,
        viewBox: box,
        'font-family': 'sans-serif',
        'font-size': decimal(map.letter),
        'text-anchor': 'middle',
      },
      [
        textElement('title', layout.name),
        element('defs', {}, definitions),
        element('g', { 'stroke-width': decimal(map.line) }, courses),
        element('g', {}, axes(layout, map)),
        element('g', { fill: 'none', 'stroke-width': decimal(2 * map.line) }, marks(layout, map)),
        element('g', { transform: `translate(0 ${decimal(map.margin)})` }, [legend.markup]),
      ],
    ),
  );
}

/** Course letters at both sides, stave numbers below and above. */
function axes({ shell, joint }: Layout, map: MapSize): Markup[] {
  const reach = Math.max(joint.staveJoint.reach, joint.courseJoint.reach);
  const away = reach + 1.2 * map.letter;
  const down = 0.35 * map.letter;
  const labels: Markup[] = [];
  for (let course = 0; course < shell.courses; course++) {
    const y = decimal(-(course + 0.5) * shell.tileHeight + down);
    for (const x of [-away, map.width + away]) {
      labels.push(textElement('text', courseLetters(course), { x: decimal(x), y }));
    }
  }
  for (let stave = 0; stave < shell.staves; stave++) {
    const x = decimal((stave + 0.5) * shell.tileWidth);
    for (const y of [away + down, -map.height - away + down]) {
      labels.push(textElement('text', String(stave + 1), { x, y: decimal(y) }));
    }
  }
  return labels;
}

/** The seam at both sides, and the two trim lines where something is cut off. */
function marks({ shell }: Layout, map: MapSize): Markup[] {
  const trim = trimOf(shell);
  const beyond = map.margin / 2;
  const dash = `${decimal(map.letter)} ${decimal(map.letter / 2)}`;
  const seam = [0, map.width].map((x) =>
    element('path', {
      d: `M${decimal(x)} ${decimal(beyond)}V${decimal(-map.height - beyond)}`,
      stroke: SEAM_COLOUR,
    }),
  );
  const trims = trim.eachEnd > 0 ? [trim.lower, trim.upper] : [];
  return [
    ...seam,
    ...trims.map((y) =>
      element('path', {
        d: `M${decimal(-beyond)} ${decimal(-y)}H${decimal(map.width + beyond)}`,
        stroke: TRIM_COLOUR,
        'stroke-dasharray': dash,
      }),
    ),
  ];
}
