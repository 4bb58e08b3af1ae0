/** Drawn on a 24 by 24 grid, open strokes of one weight. */
export const icons = {
  // Places
  bench: 'M3 9h18M5 9v11M19 9v11M5 15h14M8 9V5h8v4',
  setups: 'M4 4h11l5 5v11H4zM15 4v5h5M8 13h8M8 16.5h5',
  rack: 'M3 4h18M7.5 4v3.2M16.5 4v3.2M11.5 11.2a4 4 0 1 1-8 0 4 4 0 0 1 8 0zM20.5 11.2a4 4 0 1 1-8 0 4 4 0 0 1 8 0zM7.5 11.2v.1M16.5 11.2v.1M3 20h18',
  board: 'M4 4h16v13H4zM8 17l-2 4M16 17l2 4M12 7.5v4.5M12 14v.2',
  shop: 'M3 20V10l6 3.5V10l6 3.5V6h3l1-2h2v16zM7 20v-3h3v3',
  // Movement
  back: 'M15 5l-7 7 7 7',
  forward: 'M9 5l7 7-7 7',
  down: 'M5 9l7 7 7-7',
  up: 'M5 15l7-7 7 7',
  close: 'M6 6l12 12M18 6L6 18',
  menu: 'M4 7h16M4 12h16M4 17h16',
  // Actions
  add: 'M12 5v14M5 12h14',
  search: 'M16.5 10.5a6 6 0 1 1-12 0 6 6 0 0 1 12 0zM15 15l5.5 5.5',
  edit: 'M4 20l1-4.5L16 4.5l3.5 3.5L8.5 19zM14 6.5L17.5 10',
  copy: 'M8 8h12v12H8zM16 8V4H4v12h4',
  undo: 'M8 5L4 9l4 4M4 9h10a5 5 0 0 1 0 10h-4',
  save: 'M5 12.5l5 5L20 7',
  remove: 'M5 7h14M9 7V4h6v3M7 7l1 13h8l1-13M10.5 11v5M13.5 11v5',
  print: 'M7 9V4h10v5M7 17H4V9h16v8h-3M7 14h10v6H7z',
  working: 'M5 4h14v16H5zM8 7.5h8v3H8zM8.5 14v.1M12 14v.1M15.5 14v.1M8.5 17v.1M12 17v.1M15.5 17v.1',
  locked: 'M6 11h12v9H6zM8.5 11V8a3.5 3.5 0 0 1 7 0v3M12 14.5v2',
  person: 'M15.5 8a3.5 3.5 0 1 1-7 0 3.5 3.5 0 0 1 7 0zM5 20c.6-4 3.2-6 7-6s6.4 2 7 6',
  show: 'M2.5 12C5 7.5 8 5.5 12 5.5S19 7.5 21.5 12C19 16.5 16 18.5 12 18.5S5 16.5 2.5 12zM14.5 12a2.5 2.5 0 1 1-5 0 2.5 2.5 0 0 1 5 0z',
  day: 'M16 12a4 4 0 1 1-8 0 4 4 0 0 1 8 0zM12 2.5v2M12 19.5v2M2.5 12h2M19.5 12h2M5.3 5.3l1.4 1.4M17.3 17.3l1.4 1.4M5.3 18.7l1.4-1.4M17.3 6.7l1.4-1.4',
  night: 'M20 14.5A8.5 8.5 0 1 1 9.5 4a6.8 6.8 0 0 0 10.5 10.5z',
  setAside: 'M8.3 3h7.4L21 8.3v7.4L15.7 21H8.3L3 15.7V8.3zM8 12h8',
  note: 'M12 11v5.5M12 7.5v.1M21 12a9 9 0 1 1-18 0 9 9 0 0 1 18 0z',
} as const;

export type IconName = keyof typeof icons;
