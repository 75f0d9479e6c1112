"use client";

import { useEffect, useState } from "react";
import { type Light, lightKey } from "./light-script";

const choices: readonly { light: Light; label: string }[] = [
  { light: "day", label: "Day" },
  { light: "night", label: "Night" },
  { light: "system", label: "As the system" },
];

/** The choice in force. A browser that keeps nothing follows the system. */
function readLight(): Light {
  const { light } = document.documentElement.dataset;
  return light === "day" || light === "night" ? light : "system";
}

function applyLight(light: Light): void {
  const { dataset } = document.documentElement;
  if (light === "system") delete dataset.light;
  else dataset.light = light;
  try {
    if (light === "system") localStorage.removeItem(lightKey);
    else localStorage.setItem(lightKey, light);
  } catch {
    // Storage is refused: the choice holds until the page is left.
  }
}

/** Day, night, or as the system has it; kept in this browser. */
export function LightChoice() {
  const [light, setLight] = useState<Light>();
  useEffect(() => setLight(readLight()), []);
  const choose = (chosen: Light) => {
    applyLight(chosen);
    setLight(chosen);
  };
  return (
    <fieldset className="flex flex-wrap gap-x-6 gap-y-1 font-sans text-sm">
      <legend className="sr-only">Day or night</legend>
      {choices.map((choice) => (
        <label key={choice.light} className="flex min-h-9 items-center gap-2">
          <input
            type="radio"
            name="light"
            checked={light === choice.light}
            onChange={() => choose(choice.light)}
          />
          {choice.label}
        </label>
      ))}
    </fieldset>
  );
}
