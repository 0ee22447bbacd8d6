export interface DrawnHeights {
  heights: number[];
  /** px a metre for all that is drawn to scale. */
  scale: number;
  /** Which ones are drawn thicker than to scale, so that they can be seen. */
  isThickened: boolean[];
}

/** Heights in px that fill `height`: to scale, but none below `least`; what that costs, the others give evenly. */
export function drawnHeights(thickness_m: readonly number[], height: number, least: number): DrawnHeights {
  const isThickened = thickness_m.map(() => false);
  for (;;) {
    const raised = isThickened.filter(Boolean).length;
    const rest = thickness_m.reduce((sum, t, i) => (isThickened[i] ? sum : sum + t), 0);
    const scale = rest > 0 ? Math.max(0, height - raised * least) / rest : 0;
    const more = thickness_m.findIndex((t, i) => !isThickened[i] && t * scale < least);
    if (more < 0 || raised === thickness_m.length)
      return { heights: thickness_m.map((t, i) => (isThickened[i] ? least : t * scale)), scale, isThickened };
    isThickened[more] = true;
  }
}
