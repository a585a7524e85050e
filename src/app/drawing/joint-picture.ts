/**
 * Tab and socket drawn apart at large scale: the very outlines that are cut, with the cutter standing in
 * the tight places.
 */
import { mouthOf } from '@shared/joint/edge-profile';
import type { Layout } from '@shared/layout/schema';
import { formatLength, formatLengthFigure } from '@shared/units/format';
import type { LengthUnit } from '@shared/units/length';
import { cutterPlace, insideArcs, type CutterPlace } from './cutter-place';
import { levelDimension, uprightDimension } from './dimension';
import {
  FULL_SIZE,
  jointFrame,
  type JointFrame,
  type JointName,
  type JointPiece,
} from './joint-frame';
import {
  inkOn,
  onScreen,
  type Mark,
  type Picture,
  type PixelPoint,
  type PixelSize,
} from './picture-model';

const PLAIN_WOOD = { name: 'wood', colour: '#C8B08A' };

/** Windows narrower than this have room for short words only, in pixels. */
const NARROW = 480;

interface Drawing {
  readonly layout: Layout;
  readonly unit: LengthUnit;
  readonly frame: JointFrame;
  readonly tabWood: { readonly name: string; readonly colour: string };
  readonly socketWood: { readonly name: string; readonly colour: string };
}

/** The picture of one joint of a layout whose joints close. */
export function jointPicture(
  layout: Layout,
  joint: JointName,
  unit: LengthUnit,
  size: PixelSize,
): Picture {
  const frame = jointFrame(layout, joint, size);
  const tabWood = layout.woods[0] ?? PLAIN_WOOD;
  const drawing = { layout, unit, frame, tabWood, socketWood: layout.woods[1] ?? tabWood };
  const { profile } = frame;
  return {
    title:
      `Tab and socket of the ${joint === 'staveJoint' ? 'stave' : 'course'} joint, drawn apart: ` +
      `reach ${formatLength(profile.reach, unit)}, neck ${formatLength(profile.neck, unit)}, ` +
      `with the ${formatLength(layout.cutter.diameter, unit)} cutter in the fillet and in the socket.`,
    caption: `Drawn apart, ${timesOf(frame)} full size. Grain runs along the stave.`,
    marks: [
      {
        kind: 'window',
        ...frame.window,
        marks: [
          pieceMark(drawing, frame.socket, drawing.socketWood.colour),
          pieceMark(drawing, frame.tab, drawing.tabWood.colour),
        ],
      },
      ...nameMarks(drawing),
      ...neckMarks(drawing),
      ...reachMarks(drawing),
      ...filletCutterMarks(drawing),
      ...socketCutterMarks(drawing),
    ],
  };
}

function timesOf({ pixelsPerMm }: JointFrame): string {
  const times = pixelsPerMm / FULL_SIZE;
  return `${times >= 10 ? Math.round(times) : times.toFixed(1)} times`;
}

function pieceMark({ layout }: Drawing, piece: JointPiece, colour: string): Mark {
  const { tileWidth } = layout.shell;
  return {
    kind: 'path',
    segments: piece.outline.segments,
    view: piece.view,
    look: 'wood',
    wood: { colour, grain: { left: -tileWidth / 2, strip: tileWidth } },
  };
}

/** What each piece is, in the corner of it that lies farthest from the joint. */
function nameMarks({ frame, tabWood, socketWood }: Drawing): Mark[] {
  const { at, size } = frame.window;
  const upright = frame.joint === 'courseJoint';
  const box = (piece: JointPiece) => shownBox(frame, piece);
  const [tab, socket] = [box(frame.tab), box(frame.socket)];
  const short = size.width < NARROW;
  const foot = Math.min(tab.bottom, at.y + size.height) - 22;
  const head = Math.max(socket.top, at.y) + 26;
  return [
    {
      kind: 'text',
      at: { x: tab.left + 14, y: foot },
      text: short ? 'tab piece' : `tab piece · ${tabWood.name.toLowerCase()}`,
      anchor: 'start',
      look: inkOn(tabWood.colour),
    },
    {
      kind: 'text',
      at: upright ? { x: socket.left + 14, y: head } : { x: socket.right - 14, y: head },
      text: short ? 'socket piece' : `socket piece · ${socketWood.name.toLowerCase()}`,
      anchor: upright ? 'start' : 'end',
      look: inkOn(socketWood.colour),
    },
  ];
}

/** The part of a piece's tile that the window shows, in pixels. */
function shownBox({ window }: JointFrame, { outline, view }: JointPiece) {
  const corners = outline.segments.flatMap((segment) =>
    segment.kind === 'line' ? [segment.from, segment.to] : [],
  );
  const points = corners.map((corner) => onScreen(view, corner));
  const xs = points.map((point) => point.x);
  const ys = points.map((point) => point.y);
  return {
    left: Math.max(Math.min(...xs), window.at.x),
    right: Math.min(Math.max(...xs), window.at.x + window.size.width),
    top: Math.max(Math.min(...ys), window.at.y),
    bottom: Math.min(Math.max(...ys), window.at.y + window.size.height),
  };
}

function neckMarks({ frame, unit, tabWood }: Drawing): Mark[] {
  const { profile, point } = frame;
  const half = profile.neck / 2;
  const line = -0.62 * profile.reach;
  const text = `neck ${formatLengthFigure(profile.neck, unit)}`;
  const [from, to] = [point(-half, line), point(half, line)];
  const extensions = [-half, half].map((along): Mark => ({
    kind: 'line',
    from: point(along, profile.footRadius),
    to: point(along, line - 0.06 * profile.reach),
    look: 'thin',
  }));
  const dimension =
    frame.joint === 'courseJoint'
      ? levelDimension(from, to.x, text)
      : uprightDimension(from, to.y, text, 'left');
  const ink = inkOn(tabWood.colour);
  return [...extensions, ...dimension].map((mark) => onWood(mark, ink));
}

/** Words and lines that lie on wood take the ink that is read on it. */
function onWood(mark: Mark, ink: 'on-dark' | 'on-light'): Mark {
  if (mark.kind === 'text') return { ...mark, look: ink };
  return mark.kind === 'line' ? { ...mark, look: ink === 'on-dark' ? 'pale' : 'dark' } : mark;
}

function reachMarks({ frame, unit }: Drawing): Mark[] {
  const { profile, point, window } = frame;
  const text = `reach ${formatLengthFigure(profile.reach, unit)}`;
  const [root, tip] = [point(0, 0), point(0, profile.reach)];
  if (frame.joint === 'courseJoint') {
    const x = window.at.x + window.size.width + 20;
    return [
      ...extension({ x: tip.x, y: tip.y }, { x: x + 10, y: tip.y }),
      ...extension(
        { x: window.at.x + window.size.width - 30, y: root.y },
        { x: x + 10, y: root.y },
      ),
      ...uprightDimension({ x, y: root.y }, tip.y, text),
    ];
  }
  const y = window.at.y + window.size.height + 26;
  return [
    ...extension({ x: tip.x, y: tip.y }, { x: tip.x, y: y + 10 }),
    ...extension({ x: root.x, y: window.at.y + window.size.height - 30 }, { x: root.x, y: y + 10 }),
    ...levelDimension({ x: root.x, y }, tip.x, text).map((mark): Mark =>
      mark.kind === 'text' ? { ...mark, at: { x: mark.at.x, y: y + 20 } } : mark,
    ),
  ];
}

function extension(from: PixelPoint, to: PixelPoint): Mark[] {
  return [
    { kind: 'line', from, to, look: 'halo' },
    { kind: 'line', from, to, look: 'dashed' },
  ];
}

function filletCutterMarks({ frame, layout, unit }: Drawing): Mark[] {
  const { diameter } = layout.cutter;
  const place = placeIn(frame.tab, diameter);
  if (!place) return [];
  const centre = onScreen(frame.tab.view, place.centre);
  const radius = (diameter / 2) * frame.pixelsPerMm;
  const upright = frame.joint === 'courseJoint';
  const room = formatLengthFigure(Math.abs(place.room), unit);
  const narrow = upright && centre.x - radius - frame.window.at.x < 215;
  const fits = place.room >= -1e-6;
  const long = fits
    ? `cutter clears the fillet by ${room}`
    : `cutter too thick for the fillet by ${room}`;
  const short = fits ? `clears by ${room}` : `too thick by ${room}`;
  return [
    { kind: 'circle', centre, radius, look: fits ? 'cutter' : 'cutter-stopped' },
    {
      kind: 'text',
      at: upright
        ? { x: centre.x - radius - 10, y: centre.y }
        : { x: centre.x, y: centre.y - radius - 16 },
      text: narrow || !upright ? short : long,
      anchor: upright ? 'end' : 'middle',
      look: fits ? 'teal' : 'stop',
      ...(upright ? {} : { ground: 'paper' as const }),
    },
  ];
}

function socketCutterMarks({ frame, layout, socketWood }: Drawing): Mark[] {
  const { diameter } = layout.cutter;
  const place = placeIn(frame.socket, diameter);
  if (!place) return [];
  // a wave has no mouth to get through
  const mouth = mouthOf(layout.joint[frame.joint], layout.joint.clearance) ?? Infinity;
  const fits = place.room >= -1e-6 && mouth >= diameter - 1e-6;
  const centre = onScreen(frame.socket.view, place.centre);
  const beside = frame.point(
    frame.profile.headWidth / 2 + 0.16 * frame.profile.reach,
    frame.apart + frame.profile.reach * 0.62,
  );
  return [
    {
      kind: 'circle',
      centre,
      radius: (diameter / 2) * frame.pixelsPerMm,
      look: fits ? 'cutter' : 'cutter-stopped',
    },
    {
      kind: 'text',
      at: beside,
      text: socketWords(fits ? 'fits' : 'stuck', frame),
      anchor: frame.joint === 'courseJoint' ? 'start' : 'middle',
      look: inkOn(socketWood.colour),
    },
  ];
}

function socketWords(cutter: 'fits' | 'stuck', { joint, window }: JointFrame): string {
  if (cutter === 'stuck') return 'cutter does not get in';
  const short = window.size.width < NARROW && joint === 'staveJoint';
  return short ? 'cutter' : 'cutter in the socket';
}

function placeIn(piece: JointPiece, diameter: number): CutterPlace | null {
  const index = insideArcs(piece.outline).at(-1);
  return index === undefined ? null : cutterPlace(piece.outline, index, diameter);
}
