/** The few pictures that stand beside words: paths on a 24 × 24 ground, drawn with a round 1.8 stroke. */
export const ICONS = {
  add: 'M12 5v14M5 12h14',
  check: 'M5 12.5l4.5 4.5L19 7.5',
  compare: 'M4 5h7v14H4zM13 5h7v14h-7M7 9h1M7 12h1M16 9h1M16 12h1',
  down: 'M6.5 9.5L12 15l5.5-5.5',
  download: 'M12 4v11M7.5 11L12 15.5 16.5 11M5 19.5h14',
  edit: 'M5 19l.8-3.8L15.5 5.5l3 3L8.8 18.2zM13.5 7.5l3 3',
  file: 'M6.5 3.5h7l4 4v13h-11zM13 3.5V8h4.5',
  keep: 'M6.5 4h11v16L12 16l-5.5 4z',
  more: 'M6 12h.01M12 12h.01M18 12h.01',
  minus: 'M5 12h14',
  offline:
    'M4 4l16 16M8.5 16.5a5 5 0 0 1 5.5-1M5 12.5c1.2-1.2 2.6-2 4-2.5M12.5 9.5c2.6.1 4.9 1.2 6.5 3M12 19.5h.01',
  redo: 'M19 9H9.5a5 5 0 0 0 0 10H13M15.5 5.5L19 9l-3.5 3.5',
  restore: 'M5 5v5h5M5.5 10a7.5 7.5 0 1 1-.8 5M12 8.5V12l2.5 2',
  search: 'M10.5 17a6.5 6.5 0 1 0 0-13 6.5 6.5 0 0 0 0 13zM15.5 15.5L20 20',
  'sign-out': 'M14 5H5.5v14H14M10.5 12H20M16.5 8.5L20 12l-3.5 3.5',
  undo: 'M5 9h9.5a5 5 0 0 1 0 10H11M8.5 5.5L5 9l3.5 3.5',
  up: 'M6.5 14.5L12 9l5.5 5.5',
} as const;

export type IconName = keyof typeof ICONS;
