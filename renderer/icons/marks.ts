export { marks }
export type { MarkName }

/**
 * The marks of the identity, each one path on a 24 unit grid: 2 unit line, square ends, no fill. Only the marks a page uses
 * reach that page, drawn in place.
 */
const marks = {
  lap: 'M4 4h9a4 4 0 0 1 0 8H10a4 4 0 0 0 0 8h10M17 17l3 3-3 3',
  chapters: 'M5 3v18M5 3h11l3 3v15H5M9 9h6M9 13h6M9 17h4',
  leaf: 'M4 6h2M4 12h2M4 18h2M9 6h11M9 12h11M9 18h7',
  tag: 'M8 5h13v14H8L2 12zM7 12a1.5 1.5 0 1 0 3 0a1.5 1.5 0 1 0 -3 0z',
  pen: 'M4 20l1.2-5L16 4.2l3.8 3.8L9 18.8z M13.5 6.7l3.8 3.8',
  layers: 'M3 7l4-2 5 2 5-2 4 2M3 12l4-2 5 2 5-2 4 2M3 17l4-2 5 2 5-2 4 2',
  link: 'M10 14a4 4 0 0 0 6 0.4l3-3a4 4 0 0 0-5.7-5.7L12 7M14 10a4 4 0 0 0-6-0.4l-3 3A4 4 0 0 0 10.7 18.3L12 17',
  clock: 'M4 13a8 8 0 1 0 16 0a8 8 0 1 0 -16 0zM12 8.5V13l3 2M9.5 2h5',
  drop: 'M12 3c4 5 6 8 6 11a6 6 0 0 1-12 0c0-3 2-6 6-11zM9 14a3 3 0 0 0 3 3',
  cell: 'M3 8h16v9H3zM19 11h2.5v3H19M7 8v9M11 12.5h4M13 10.5v4',
  gear: 'M9 12a3 3 0 1 0 6 0a3 3 0 1 0 -6 0zM12 2.5v3M12 18.5v3M2.5 12h3M18.5 12h3M5.3 5.3l2.1 2.1M16.6 16.6l2.1 2.1M5.3 18.7l2.1-2.1M16.6 7.4l2.1-2.1M5.5 12a6.5 6.5 0 1 0 13 0a6.5 6.5 0 1 0 -13 0z',
  bottle: 'M9 2.5h5v4l3 4V21.5H6V10.5l3-4zM6 14h11M14 4.5h4',
  caution: 'M12 3L22 20.5H2zM12 9.5v5M12 16.7v1.3',
  check: 'M4 13l5 5L20 6',
  cross: 'M5 5l14 14M19 5L5 19',
  plus: 'M12 4v16M4 12h16',
  minus: 'M4 12h16',
  query: 'M8 8a4 4 0 1 1 5.5 3.7c-1 0.5-1.5 1.2-1.5 2.8M12 18v1.5',
  right: 'M4 12h15M13 6l6 6-6 6',
  left: 'M20 12H5M11 6l-6 6 6 6',
  down: 'M6 9l6 6 6-6',
  picture: 'M3 5h18v14H3zM3 16l5-5 5 5 3-3 5 5M14 9.5a1.5 1.5 0 1 0 3 0a1.5 1.5 0 1 0 -3 0z',
  rows: 'M3 8h18M3 16h18M6 8V5M9.5 8V5M6 16v3M13 16v-3M16.5 16v-3',
  calc: 'M4 20V4M4 20h16M6 17c4-1 4-9 8-10 2-0.5 4 0 6 0',
  car: 'M9 3h6l1 5v8l-1 5H9l-1-5V8zM3 4h3v5H3zM18 4h3v5h-3zM3 15h3v6H3zM18 15h3v6h-3zM6 6.5h2.3M15.7 6.5H18M6 18h2M16 18h2',
  back: 'M4 9h11a5 5 0 0 1 0 10H8M8 5L4 9l4 4',
  sun: 'M8 12a4 4 0 1 0 8 0a4 4 0 1 0 -8 0zM12 2v3M12 19v3M2 12h3M19 12h3M5 5l2 2M17 17l2 2M5 19l2-2M17 7l2-2',
  eye: 'M2 12c5-7 15-7 20 0-5 7-15 7-20 0zM9 12a3 3 0 1 0 6 0a3 3 0 1 0 -6 0z',
  note: 'M4 4h16v12h-9l-4 4v-4H4z',
  phone: 'M7 2.5h10v19H7zM10.5 18.5h3',
  desk: 'M3 4h18v12H3zM8 20.5h8M12 16v4.5',
  source: 'M4 13h6v6H4zM4 13c0-4 1-6 5-8M14 13h6v6h-6zM14 13c0-4 1-6 5-8',
  heat: 'M9 13V5.5a3 3 0 0 1 6 0V13a5 5 0 1 1-6 0zM12 8v8',
  blade: 'M3 21l5-5M6 14l4 4M8 16L19.5 4.5v6L12 18z',
  list: 'M4 6h16M4 12h16M4 18h16',
  moon: 'M19.5 14.5A8 8 0 1 1 9.5 4.5a6.5 6.5 0 0 0 10 10z',
  person: 'M7.5 8a4.5 4.5 0 1 0 9 0a4.5 4.5 0 1 0-9 0zM4 21.5c0-4 3.5-6 8-6s8 2 8 6',
  iron: 'M3 21l6-6M8 14l2 2M10 15l9-9 2 2-9 9zM15 4c1-1 1-2 0-3',
} as const

type MarkName = keyof typeof marks
