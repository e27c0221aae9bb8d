/** Where the parts of a tolerance ruler lie. Values in any one unit; positions in px. Pure, so that phone, report and print draw the same. */

export interface RulerScale {
  readonly low: number;
  readonly high: number;
}

export interface RulerValues {
  readonly scale: RulerScale;
  /** Limits of the value itself; `null` on a side without a limit. */
  readonly band: { readonly low: number | null; readonly high: number | null } | null;
  readonly target: number | null;
  readonly actual: { readonly value: number; readonly plusMinus: number } | null;
}

export type OffScale = 'low' | 'high' | null;

export interface RulerGeometry {
  readonly axis: { readonly from: number; readonly to: number };
  /** `from` and `to` lie at the end of the axis where the band has no limit or goes beyond the scale. */
  readonly band: {
    readonly from: number;
    readonly to: number;
    readonly limits: readonly { readonly x: number; readonly side: 'low' | 'high' }[];
  } | null;
  readonly target: number | null;
  /** A mark beyond the scale stands at its end, as an arrow: the scale itself never moves. */
  readonly mark: { readonly x: number; readonly offScale: OffScale } | null;
  readonly whisker: {
    readonly from: number;
    readonly to: number;
    readonly caps: readonly number[];
  } | null;
}

/** Room for half a mark at both ends. */
const MARGIN_PX = 12;

const offScaleOf = (value: number, scale: RulerScale): OffScale => {
  if (value < scale.low) return 'low';
  return value > scale.high ? 'high' : null;
};

export function rulerGeometry(values: RulerValues, widthPx: number): RulerGeometry {
  const { scale, band, target, actual } = values;
  const axis = { from: MARGIN_PX, to: Math.max(widthPx - MARGIN_PX, MARGIN_PX + 1) };
  const on = (value: number): number =>
    axis.from + ((value - scale.low) / (scale.high - scale.low)) * (axis.to - axis.from);
  const within = (value: number): number => Math.min(Math.max(on(value), axis.from), axis.to);
  const isOn = (value: number): boolean => offScaleOf(value, scale) === null;

  const limits =
    band === null
      ? []
      : (['low', 'high'] as const).flatMap((side) => {
          const limit = band[side];
          return limit !== null && isOn(limit) ? [{ x: on(limit), side }] : [];
        });
  const ends = actual === null ? null : { low: actual.value - actual.plusMinus, high: actual.value + actual.plusMinus };
  return {
    axis,
    band: band === null ? null : { from: within(band.low ?? scale.low), to: within(band.high ?? scale.high), limits },
    target: target !== null && isOn(target) ? on(target) : null,
    mark: actual === null ? null : { x: within(actual.value), offScale: offScaleOf(actual.value, scale) },
    whisker:
      ends === null || actual === null || !isOn(actual.value)
        ? null
        : {
            from: within(ends.low),
            to: within(ends.high),
            caps: [ends.low, ends.high].filter(isOn).map(on),
          },
  };
}

export interface RulerLabel {
  readonly x: number;
  readonly text: string;
  readonly fontPx: number;
}

/** Mean advance of Noto Sans for figures and lower case, as a share of the font size; measured by eye, generous. */
const ADVANCE = 0.6;
const GAP_PX = 8;

const widthOf = ({ text, fontPx }: RulerLabel): number => text.length * fontPx * ADVANCE;

const distanceOf = (a: RulerLabel, b: RulerLabel): number => (widthOf(a) + widthOf(b)) / 2 + GAP_PX;

const inside = (label: RulerLabel, widthPx: number): RulerLabel => {
  const half = widthOf(label) / 2;
  return { ...label, x: Math.min(Math.max(label.x, half), Math.max(widthPx - half, half)) };
};

/**
 * Two centred labels of one row, moved apart where they would overlap: first the second one gives way, and only when it reaches the end
 * of the drawing the first. They never change sides, so that each stays by what it names.
 */
export function placePair(
  first: RulerLabel,
  second: RulerLabel,
  widthPx: number,
): readonly [first: RulerLabel, second: RulerLabel] {
  const side = second.x < first.x ? -1 : 1;
  const distance = distanceOf(first, second);
  const beyond = (x: number, limit: number, way: number): number => (way < 0 ? Math.min(x, limit) : Math.max(x, limit));
  const start = inside(first, widthPx);
  const moved = inside({ ...second, x: beyond(second.x, start.x + side * distance, side) }, widthPx);
  return [inside({ ...start, x: beyond(start.x, moved.x - side * distance, -side) }, widthPx), moved];
}

/** Whether a label stands clear of others in its row, where it is. */
export const isClear = (label: RulerLabel, others: readonly RulerLabel[]): boolean =>
  others.every((other) => Math.abs(other.x - label.x) >= distanceOf(other, label));
