import { boundsOf, type Outline } from '@shared/geometry/outline';
import { printDecimal } from '../decimal';
import { pathData, SVG_DECIMALS } from './path-data';
import { element, textElement, xmlFile } from './xml';

export interface PieceDrawing {
  readonly outline: Outline;
  /** Said in `<title>`, e.g. "01 White ash". */
  readonly title: string;
  /** Fill as "#RRGGBB". */
  readonly colour: string;
}

/**
 * One piece as an SVG file: as large as the piece, one user unit a millimetre, the centre of its nominal
 * tile at the origin, y flipped because SVG's runs down. One closed path without a stroke, so what is
 * painted is exactly the piece.
 */
export function pieceSvg({ outline, title, colour }: PieceDrawing): string {
  const { minX, minY, maxX, maxY } = boundsOf(outline.segments);
  const width = decimal(maxX - minX);
  const height = decimal(maxY - minY);
  return xmlFile(
    element(
      'svg',
      {
        xmlns: 'http://www.w3.org/2000/svg',
        width: `${width}mm`,
        height: `${height}mm`,
        viewBox: `${decimal(minX)} ${decimal(-maxY)} ${width} ${height}`,
      },
      [
        textElement('title', title),
        element('path', { fill: colour, d: pathData(outline.segments, { flipY: true }) }),
      ],
    ),
  );
}

function decimal(value: number): string {
  return printDecimal(value, SVG_DECIMALS);
}
