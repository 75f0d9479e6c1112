/** Where the reader's choice between day and night is kept in the browser. */
export const lightKey = "leading-order.light";

export type Light = "day" | "night" | "system";

/** Runs before anything is painted, so that a choice of night does not flash by day. */
export const lightScript = `try{var l=localStorage.getItem("${lightKey}");if(l==="day"||l==="night")document.documentElement.dataset.light=l}catch{}`;
