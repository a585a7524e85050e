/**
 * The shell in parallel projection, for browsers without WebGL: a point at angle a and height v lies at
 * x = R sin a, y = v cos(tilt) − R cos a sin(tilt). Millimetres, y down.
 */
import { toRadians, type Radians } from '@shared/units/angle';
import type { Millimetres } from '@shared/units/length';
import type { PictureTile, ShellPicture } from './shell-picture';

const TILT = toRadians(16);
const UP = Math.cos(TILT);
const DEEP = Math.sin(TILT);

export interface ProjectedPath {
  readonly d: string;
  readonly fill: string;
}

export interface ProjectedShell {
  readonly viewBox: string;
  /** The wall between the trimmed ends, to clip the tiles with. */
  readonly wall: string;
  readonly tiles: readonly ProjectedPath[];
  /** One piece of the upper end a stave. */
  readonly rim: readonly ProjectedPath[];
  readonly bore: string;
  readonly shadow: string;
}

/** The drawing of a shell turned by an angle. */
export function projectShell(picture: ShellPicture, turn: Radians): ProjectedShell {
  const { outerRadius, innerRadius, bottom, top } = picture;
  const height = (top - bottom) * UP;
  const margin = outerRadius * 0.12;
  const across = 2 * (outerRadius + margin);
  const tall = height + 2 * (outerRadius * DEEP + margin);
  return {
    viewBox: `${f(-across / 2)} ${f(-height - outerRadius * DEEP - margin)} ${f(across)} ${f(tall)}`,
    wall: wallPath(outerRadius, height),
    tiles: picture.tiles
      .filter((tile) => faces(picture, tile, turn))
      .map((tile) => tilePath(picture, tile, turn)),
    rim: picture.tiles
      .filter((tile) => tile.course === picture.courses - 1)
      .map((tile) => rimPath(picture, tile, turn, -height)),
    bore: ellipse(innerRadius, -height),
    shadow: ellipse(outerRadius * 1.05, outerRadius * 0.02),
  };
}

function angleOf(picture: ShellPicture, along: Millimetres, turn: Radians): Radians {
  return (along / (picture.tileWidth * picture.staves)) * 2 * Math.PI + turn;
}

/** A tab reaches into the next stave, so a tile that has just passed the edge is still drawn. */
function faces(picture: ShellPicture, tile: PictureTile, turn: Radians): boolean {
  const beyond = -Math.sin((1.5 * 2 * Math.PI) / picture.staves);
  return Math.cos(angleOf(picture, tile.centre.x, turn)) > beyond;
}

function tilePath(picture: ShellPicture, tile: PictureTile, turn: Radians): ProjectedPath {
  const corners = tile.outline.map((corner) => {
    const angle = clampToFront(angleOf(picture, tile.centre.x + corner.x, turn));
    const x = picture.outerRadius * Math.sin(angle);
    const height = (tile.centre.y + corner.y - picture.bottom) * UP;
    return `${f(x)} ${f(picture.outerRadius * Math.cos(angle) * DEEP - height)}`;
  });
  return { d: `M${corners.join('L')}Z`, fill: tile.colour };
}

/** Past the edge of what can be seen an outline runs on straight down the edge. */
function clampToFront(angle: Radians): Radians {
  const nearest = Math.atan2(Math.sin(angle), Math.cos(angle));
  return Math.min(Math.max(nearest, -Math.PI / 2), Math.PI / 2);
}

function rimPath(
  picture: ShellPicture,
  tile: PictureTile,
  turn: Radians,
  level: Millimetres,
): ProjectedPath {
  const half = Math.PI / picture.staves;
  const middle = angleOf(picture, tile.centre.x, turn);
  const at = (radius: Millimetres, angle: Radians) =>
    `${f(radius * Math.sin(angle))} ${f(level + radius * Math.cos(angle) * DEEP)}`;
  const { outerRadius, innerRadius } = picture;
  const d = `M${at(outerRadius, middle - half)}L${at(outerRadius, middle + half)}L${at(innerRadius, middle + half)}L${at(innerRadius, middle - half)}Z`;
  return { d, fill: tile.colour };
}

function wallPath(radius: Millimetres, height: Millimetres): string {
  const arc = `A${f(radius)} ${f(radius * DEEP)} 0 0`;
  return `M${f(-radius)} ${f(-height)}${arc} 0 ${f(radius)} ${f(-height)}V0${arc} 1 ${f(-radius)} 0Z`;
}

function ellipse(radius: Millimetres, level: Millimetres): string {
  const arc = `A${f(radius)} ${f(radius * DEEP)} 0 1 0`;
  return `M${f(-radius)} ${f(level)}${arc} ${f(radius)} ${f(level)}${arc} ${f(-radius)} ${f(level)}Z`;
}

function f(figure: number): string {
  return figure.toFixed(2);
}
