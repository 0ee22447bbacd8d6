import { type RefObject, useEffect, useLayoutEffect, useState } from 'react';

export interface Rows {
  /** Middle of each row below the first row's top, by its key, px. */
  centres: ReadonlyMap<string, number>;
  /** First row's top below the frame's. */
  top: number;
  height: number;
}

const NONE: Rows = { centres: new Map(), top: 0, height: 0 };

/** Where the `[data-layer]` rows inside `frame` stand, so that something can be drawn beside them; kept up to date. */
export function useRowCentres(frame: RefObject<HTMLElement | null>): Rows {
  const [rows, setRows] = useState(NONE);
  const measure = () => {
    const next = frame.current ? placesOf(frame.current) : NONE;
    setRows((now) => (alike(now, next) ? now : next));
  };
  // After every change of the rows; when only the width changes, the observer says so.
  useLayoutEffect(measure);
  useEffect(() => {
    const node = frame.current;
    if (!node) return;
    const observer = new ResizeObserver(measure);
    observer.observe(node);
    return () => observer.disconnect();
  });
  return rows;
}

function placesOf(frame: HTMLElement): Rows {
  const from = frame.getBoundingClientRect().top;
  const boxes = [...frame.querySelectorAll<HTMLElement>('[data-layer]')].map(
    (row) => [row.dataset.layer ?? '', row.getBoundingClientRect()] as const,
  );
  if (boxes.length === 0) return NONE;
  const top = boxes[0][1].top;
  const bottom = boxes[boxes.length - 1][1].bottom;
  return {
    centres: new Map(boxes.map(([key, box]) => [key, Math.round(box.top + box.height / 2 - top)])),
    top: Math.round(top - from),
    height: Math.round(bottom - top),
  };
}

const alike = (a: Rows, b: Rows): boolean =>
  a.top === b.top &&
  a.height === b.height &&
  a.centres.size === b.centres.size &&
  [...b.centres].every(([key, y]) => a.centres.get(key) === y);
