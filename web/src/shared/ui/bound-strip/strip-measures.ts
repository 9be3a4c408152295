export type StripSize = 'small' | 'large';

/** The measures of one strip in pixels. */
export interface StripMeasures {
  size: StripSize;
  width: number;
  height: number;
  /** The ground line's y. */
  ground: number;
  stone: { width: number; height: number };
  /** Font size of the figures, and the height of one row of them. */
  figure: number;
  labelRow: number;
  /** From a share of the axis to pixels; half a stone's room is kept at both ends. */
  x: (share: number) => number;
}

export function measuresOf(size: StripSize, width: number): StripMeasures {
  const stone = size === 'large' ? { width: 11, height: 19 } : { width: 7, height: 12 };
  const inset = stone.width / 2 + 1;
  return {
    size,
    width,
    stone,
    ...(size === 'large' ? { height: 62, ground: 41 } : { height: 22, ground: 16 }),
    figure: 13,
    labelRow: 15,
    x: (share) => inset + share * (width - 2 * inset),
  };
}
