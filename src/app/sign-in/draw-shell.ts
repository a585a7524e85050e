/**
 * Draws a shell standing on the ground, seen a little from above, in parallel projection: a point at
 * angle a and height v lies at x = R sin a, y = v cos(tilt) − R cos a sin(tilt). No perspective, so a
 * whole turn needs nothing but sines.
 */
import { toRadians, type Radians } from '@shared/units/angle';
import type { Millimetres } from '@shared/units/length';
import type { PictureTile, ShellPicture } from '../wrapped-shell/shell-picture';

const TILT = toRadians(15);
const UP = Math.cos(TILT);
const DEEP = Math.sin(TILT);
const LINE = 'rgb(30 42 54 / 72%)';
const GRAIN = 'rgb(0 0 0 / 9%)';

/** Where the shell stands on the canvas, in pixels. */
interface Stage {
  readonly scale: number;
  readonly middle: number;
  readonly ground: number;
}

type Pen = CanvasRenderingContext2D;

/** Draws the whole picture; `turn` is how far the shell is turned, `width` and `height` in pixels. */
export function drawShell(
  pen: Pen,
  picture: ShellPicture,
  view: { readonly turn: Radians; readonly width: number; readonly height: number },
): void {
  pen.clearRect(0, 0, view.width, view.height);
  const stage = stageFor(picture, view);
  drawShadow(pen, picture, stage);
  drawOutside(pen, picture, stage, view.turn);
  drawRim(pen, picture, stage, view.turn);
  drawInside(pen, picture, stage, view.turn);
}

function stageFor(picture: ShellPicture, view: { width: number; height: number }): Stage {
  const tall = (picture.top - picture.bottom) * UP + 2 * picture.outerRadius * DEEP;
  const scale = Math.min(
    (view.width * 0.88) / (2 * picture.outerRadius),
    (view.height * 0.9) / tall,
  );
  return {
    scale,
    middle: view.width / 2,
    ground: (view.height + tall * scale) / 2 - picture.outerRadius * DEEP * scale,
  };
}

/** Height on the canvas of the circle's middle at a height above the finished bottom. */
function levelOf(picture: ShellPicture, stage: Stage, height: Millimetres): number {
  return stage.ground - (height - picture.bottom) * UP * stage.scale;
}

function circle(pen: Pen, stage: Stage, level: number, radius: Millimetres): void {
  const across = radius * stage.scale;
  pen.ellipse(stage.middle, level, across, across * DEEP, 0, 0, 2 * Math.PI);
}

function drawShadow(pen: Pen, picture: ShellPicture, stage: Stage): void {
  pen.fillStyle = 'rgb(0 0 0 / 14%)';
  pen.beginPath();
  circle(pen, stage, stage.ground + 6, picture.outerRadius * 1.045);
  pen.fill();
}

function angleOf(picture: ShellPicture, along: Millimetres, turn: Radians): Radians {
  return (along / (picture.tileWidth * picture.staves)) * 2 * Math.PI + turn;
}

function drawOutside(pen: Pen, picture: ShellPicture, stage: Stage, turn: Radians): void {
  pen.save();
  clipToWall(pen, picture, stage);
  // A tab reaches into the next stave, so one that has just passed the edge is still drawn.
  const beyond = -Math.sin((1.5 * 2 * Math.PI) / picture.staves);
  pen.lineWidth = 1;
  pen.strokeStyle = LINE;
  for (const tile of picture.tiles) {
    const facing = Math.cos(angleOf(picture, tile.centre.x, turn));
    if (facing > beyond) drawTile(pen, picture, stage, tile, turn);
  }
  drawDaylight(pen, picture, stage);
  pen.restore();
}

/** The band between the two trimmed ends, as far as it can be seen. */
function clipToWall(pen: Pen, picture: ShellPicture, stage: Stage): void {
  const across = picture.outerRadius * stage.scale;
  const top = levelOf(picture, stage, picture.top);
  pen.beginPath();
  pen.ellipse(stage.middle, stage.ground, across, across * DEEP, 0, 0, Math.PI);
  pen.lineTo(stage.middle - across, top);
  pen.ellipse(stage.middle, top, across, across * DEEP, 0, Math.PI, 0, true);
  pen.closePath();
  pen.clip();
}

function drawTile(
  pen: Pen,
  picture: ShellPicture,
  stage: Stage,
  tile: PictureTile,
  turn: Radians,
): void {
  const radius = picture.outerRadius * stage.scale;
  const point = (along: Millimetres, height: Millimetres): [number, number] => {
    // Past the edge of what can be seen the outline runs on straight down the edge.
    const angle = clampToFront(angleOf(picture, along, turn));
    return [
      stage.middle + radius * Math.sin(angle),
      levelOf(picture, stage, height) + radius * Math.cos(angle) * DEEP,
    ];
  };
  const { centre } = tile;
  const outline = new Path2D();
  for (const corner of tile.outline) {
    outline.lineTo(...point(centre.x + corner.x, centre.y + corner.y));
  }
  outline.closePath();
  pen.fillStyle = tile.colour;
  pen.fill(outline);
  const grain = new Path2D();
  for (const share of grainOfTile(tile)) {
    const along = centre.x + share * picture.tileWidth;
    grain.moveTo(...point(along, centre.y - 0.8 * picture.tileHeight));
    grain.lineTo(...point(along, centre.y + 0.8 * picture.tileHeight));
  }
  pen.save();
  pen.clip(outline);
  pen.strokeStyle = GRAIN;
  pen.stroke(grain);
  pen.restore();
  pen.stroke(outline);
}

/** Four lines of grain, different from tile to tile. */
function grainOfTile(tile: PictureTile): readonly number[] {
  const shift = ((tile.stave * 7 + tile.course * 13) % 10) / 60;
  return [-0.4 + shift, -0.17 - shift / 2, 0.08 + shift, 0.33 - shift / 3];
}

function clampToFront(angle: Radians): Radians {
  const nearest = Math.atan2(Math.sin(angle), Math.cos(angle));
  return Math.min(Math.max(nearest, -Math.PI / 2), Math.PI / 2);
}

function drawDaylight(pen: Pen, picture: ShellPicture, stage: Stage): void {
  const across = picture.outerRadius * stage.scale;
  const light = pen.createLinearGradient(stage.middle - across, 0, stage.middle + across, 0);
  light.addColorStop(0, 'rgb(20 14 8 / 52%)');
  light.addColorStop(0.16, 'rgb(20 14 8 / 16%)');
  light.addColorStop(0.4, 'rgb(255 250 240 / 14%)');
  light.addColorStop(0.62, 'rgb(20 14 8 / 4%)');
  light.addColorStop(0.86, 'rgb(20 14 8 / 26%)');
  light.addColorStop(1, 'rgb(20 14 8 / 62%)');
  pen.fillStyle = light;
  const top = levelOf(picture, stage, picture.top) - across * DEEP;
  pen.fillRect(stage.middle - across, top, 2 * across, stage.ground + across * DEEP - top);
}

/** The turned upper end: every stave shows the end grain of its last course. */
function drawRim(pen: Pen, picture: ShellPicture, stage: Stage, turn: Radians): void {
  const level = levelOf(picture, stage, picture.top);
  const outer = picture.outerRadius * stage.scale;
  const half = Math.PI / picture.staves;
  pen.strokeStyle = LINE;
  pen.lineWidth = 1;
  for (const tile of picture.tiles) {
    if (tile.course !== picture.courses - 1) continue;
    // Angles of the canvas run clockwise from the right; ours run from the front to the right.
    const middle = Math.PI / 2 - angleOf(picture, tile.centre.x, turn);
    pen.beginPath();
    pen.moveTo(stage.middle, level);
    pen.ellipse(stage.middle, level, outer, outer * DEEP, 0, middle - half, middle + half);
    pen.closePath();
    pen.fillStyle = tile.colour;
    pen.fill();
    pen.stroke();
  }
  pen.beginPath();
  circle(pen, stage, level, picture.outerRadius);
  pen.stroke();
}

/** The bored inside: the far wall's upper courses, in the shade. */
function drawInside(pen: Pen, picture: ShellPicture, stage: Stage, turn: Radians): void {
  const level = levelOf(picture, stage, picture.top);
  const inner = picture.innerRadius * stage.scale;
  const half = Math.PI / picture.staves;
  pen.save();
  pen.beginPath();
  circle(pen, stage, level, picture.innerRadius);
  pen.clip();
  for (const tile of picture.tiles) {
    const angle = angleOf(picture, tile.centre.x, turn);
    if (Math.cos(angle) > 0.2) continue;
    const left = stage.middle + inner * Math.sin(angle - half);
    const right = stage.middle + inner * Math.sin(angle + half);
    const far = inner * Math.cos(angle) * DEEP;
    const top = levelOf(picture, stage, tile.centre.y + picture.tileHeight / 2) + far;
    pen.fillStyle = tile.colour;
    pen.fillRect(left, top - 1, right - left, picture.tileHeight * UP * stage.scale + 2);
  }
  const shade = pen.createLinearGradient(0, level - inner * DEEP, 0, level + inner * DEEP);
  shade.addColorStop(0, 'rgb(24 16 10 / 70%)');
  shade.addColorStop(1, 'rgb(24 16 10 / 92%)');
  pen.fillStyle = shade;
  pen.fillRect(stage.middle - inner, level - inner * DEEP, 2 * inner, 2 * inner * DEEP);
  pen.restore();
  pen.strokeStyle = LINE;
  pen.beginPath();
  circle(pen, stage, level, picture.innerRadius);
  pen.stroke();
}
