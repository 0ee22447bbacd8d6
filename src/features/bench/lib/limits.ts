/** Beyond these a typed value is a slip, not a design: the farthest capacitor on a board, and the worst mount. */
export const MOST_DISTANCE_M = 1;
export const MOST_MOUNT_H = 1e-6;
