import type { InputHTMLAttributes } from 'react';
import { cx } from '@/lib/class-names';

/** Width of the float: a track of plot width needs half of it at either end. */
export const FLOAT_PX = 18;

const TRACK =
  '[&::-webkit-slider-runnable-track]:h-px [&::-webkit-slider-runnable-track]:bg-stone [&::-moz-range-track]:h-px [&::-moz-range-track]:bg-stone';
const WEBKIT_FLOAT =
  '[&::-webkit-slider-thumb]:-mt-[8.5px] [&::-webkit-slider-thumb]:size-[18px] [&::-webkit-slider-thumb]:appearance-none [&::-webkit-slider-thumb]:rounded-full [&::-webkit-slider-thumb]:border-[5px] [&::-webkit-slider-thumb]:border-solid [&::-webkit-slider-thumb]:border-deep [&::-webkit-slider-thumb]:bg-paper';
const MOZ_FLOAT =
  '[&::-moz-range-thumb]:box-border [&::-moz-range-thumb]:size-[18px] [&::-moz-range-thumb]:rounded-full [&::-moz-range-thumb]:border-[5px] [&::-moz-range-thumb]:border-solid [&::-moz-range-thumb]:border-deep [&::-moz-range-thumb]:bg-paper';

interface Props
  extends Omit<
    InputHTMLAttributes<HTMLInputElement>,
    'type' | 'min' | 'max' | 'step' | 'value' | 'onChange'
  > {
  label: string;
  low: number;
  high: number;
  step: number;
  value: number;
  /** The value as it is read out. */
  text: string;
  onSlide: (value: number) => void;
}

/** The browser's own range control as a float on a hairline: dragged, or moved by arrows, page and end keys. */
export function Slider({ label, low, high, step, value, text, onSlide, className, ...rest }: Props) {
  return (
    <input
      type="range"
      aria-label={label}
      aria-valuetext={text}
      min={low}
      max={high}
      step={step}
      value={Math.min(high, Math.max(low, value))}
      onChange={(event) => onSlide(Number(event.target.value))}
      className={cx(
        'block h-7 cursor-grab appearance-none bg-transparent active:cursor-grabbing',
        TRACK,
        WEBKIT_FLOAT,
        MOZ_FLOAT,
        className,
      )}
      {...rest}
    />
  );
}
