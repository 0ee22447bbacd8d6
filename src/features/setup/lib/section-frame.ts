import type { SectionGeometry } from './section-geometry';

/** Room around the board, px: measures at the left, names at the right, the part over it, measures under it. */
export const ROOM = { left: 86, right: 108, part: 24, foot: 30 } as const;
const MOST_DEPTH = 300;
const MOST_PX_PER_MM = 340;
const NAME_GAP = 15;

/** Turns millimetres of the section into px; on the bottom side the picture hangs upside down, as the part does. */
export interface SectionFrame {
  scale: number;
  height: number;
  isTop: boolean;
  x: (mm: number) => number;
  z: (mm: number) => number;
  box: (
    x: readonly [number, number],
    z: readonly [number, number],
  ) => { x: number; y: number; width: number; height: number };
}

export function sectionFrame(geometry: SectionGeometry, side: 'top' | 'bottom', width: number): SectionFrame {
  const room = width - ROOM.left - ROOM.right;
  const scale = Math.min(room / geometry.width, MOST_DEPTH / geometry.depth, MOST_PX_PER_MM);
  const isTop = side === 'top';
  const board = geometry.depth * scale;
  // Names need their room even where the board is thin.
  const names = geometry.layers.filter(({ layer }) => layer.kind === 'copper').length * NAME_GAP;
  const body = Math.max(board + ROOM.part, names + 4);
  const outer = isTop ? ROOM.part : board;
  const left = ROOM.left + Math.max(0, (room - geometry.width * scale) / 2);
  const x = (mm: number) => left + mm * scale;
  const z = (mm: number) => outer + (isTop ? 1 : -1) * mm * scale;
  return {
    scale,
    height: body + ROOM.foot,
    isTop,
    x,
    z,
    box: ([x0, x1], [z0, z1]) => ({
      x: x(x0),
      y: Math.min(z(z0), z(z1)),
      width: Math.max(0, (x1 - x0) * scale),
      height: Math.abs(z1 - z0) * scale,
    }),
  };
}
