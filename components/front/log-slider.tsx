"use client";

import { type ReactNode, useId } from "react";

/** Steps along the whole way of the slider. */
const steps = 200;

/** A slider whose way is even in the logarithm, as a quantity over decades asks for. */
export function LogSlider({
  label,
  shown,
  spoken,
  from,
  to,
  value,
  onChange,
}: {
  label: string;
  /** The value with its unit, for the eye and for a screen reader. */
  shown: ReactNode;
  spoken: string;
  from: number;
  to: number;
  value: number;
  onChange: (value: number) => void;
}) {
  const id = useId();
  const span = Math.log(to / from);
  const place = Math.round((Math.log(value / from) / span) * steps);
  return (
    <div>
      <label htmlFor={id} className="flex justify-between gap-4">
        <span className="font-medium">{label}</span>
        <span className="figures text-faint">{shown}</span>
      </label>
      <input
        id={id}
        type="range"
        min={0}
        max={steps}
        value={Math.min(Math.max(place, 0), steps)}
        aria-valuetext={spoken}
        onChange={(event) => onChange(from * Math.exp((span * Number(event.target.value)) / steps))}
        className="slider mt-1 h-6 w-full"
      />
    </div>
  );
}
