/** Paints a picture with svg.js. */
import { pathData } from '@exports/svg/path-data';
import { boundsOf } from '@shared/geometry/outline';
import type { Container, Element, Svg } from '@svgdotjs/svg.js';
import { grainColour, grainOf } from './grain';
import type { Mark, Picture, PixelSize, View, WoodFill } from './picture-model';

type PathMark = Extract<Mark, { kind: 'path' }>;
type TextMark = Extract<Mark, { kind: 'text' }>;

/** Replaces what the drawing shows by this picture. */
export function paintPicture(svg: Svg, picture: Picture, size: PixelSize): void {
  svg.clear();
  svg.size(size.width, size.height).viewbox(0, 0, size.width, size.height);
  for (const mark of picture.marks) paintMark(svg, mark);
}

function paintMark(onto: Container, mark: Mark): void {
  switch (mark.kind) {
    case 'path':
      paintPath(onto, mark);
      return;
    case 'circle': {
      const { centre, radius, look } = mark;
      onto
        .circle(2 * radius)
        .center(centre.x, centre.y)
        .addClass(look);
      return;
    }
    case 'line':
      onto.line(mark.from.x, mark.from.y, mark.to.x, mark.to.y).addClass(mark.look);
      return;
    case 'text':
      paintText(onto, mark);
      return;
    case 'lens': {
      const { centre, radius } = mark;
      const opening = onto.circle(2 * radius).center(centre.x, centre.y);
      paintThrough(onto, opening, mark.marks);
      onto
        .circle(2 * radius)
        .center(centre.x, centre.y)
        .addClass('rim');
      return;
    }
    case 'window': {
      const { at, size } = mark;
      paintThrough(onto, onto.rect(size.width, size.height).move(at.x, at.y), mark.marks);
      return;
    }
  }
}

function paintThrough(onto: Container, opening: Element, marks: readonly Mark[]): void {
  const group = onto.group();
  for (const mark of marks) paintMark(group, mark);
  group.clipWith(onto.clip().add(opening));
}

function paintPath(onto: Container, mark: PathMark): void {
  const data = pathData(mark.segments);
  if (data === '') return;
  const place = placed(mark.view);
  if (mark.wood) paintWood(onto, mark, data, mark.wood);
  onto.path(data).attr('transform', place).attr('fill', 'none').addClass(mark.look);
}

function paintWood(onto: Container, mark: PathMark, data: string, wood: WoodFill): void {
  const place = placed(mark.view);
  const ground = onto.path(data).attr('transform', place).attr('fill', wood.colour);
  if (wood.shade) ground.clone().insertAfter(ground).css('fill', 'rgb(0 0 0 / 10%)');
  if (!wood.grain) return;
  const { minX, maxX, minY, maxY } = boundsOf(mark.segments);
  const { left, strip } = wood.grain;
  const grain = onto.group().attr('transform', place);
  for (let start = Math.floor((minX - left) / strip); left + start * strip < maxX; start++) {
    for (const line of grainOf(wood.colour)) {
      const x = left + (start + line.at - line.width / 2) * strip;
      grain
        .rect(line.width * strip, maxY - minY)
        .move(x, minY)
        .css('fill', grainColour(line));
    }
  }
  grain.clipWith(onto.clip().add(onto.path(data)));
}

function placed({ pixelsPerMm, origin }: View): string {
  return `matrix(${pixelsPerMm} 0 0 ${-pixelsPerMm} ${origin.x} ${origin.y})`;
}

function paintText(onto: Container, { at, text, anchor, look, turn, ground }: TextMark): void {
  const words = onto
    .plain(text)
    .attr({ x: at.x, y: at.y, 'text-anchor': anchor, 'dominant-baseline': 'central' })
    .addClass(look);
  if (turn) words.attr('transform', `rotate(-90 ${at.x} ${at.y})`);
  if (ground) words.addClass('on-paper');
}
