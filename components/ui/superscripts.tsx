const superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺";
const plain = "0123456789−+";

/** Text with its raised characters (cm⁻², 10³⁹) set as raised figures of the typeface in force. */
export function Superscripts({ text }: { text: string }) {
  const parts = text.split(/([⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺]+)/u);
  return parts.map((part, index) => {
    const lowered = [...part].map((ch) => plain[superscripts.indexOf(ch)] ?? ch).join("");
    // Parts are found by their place: the text is set afresh as a whole.
    // biome-ignore lint/suspicious/noArrayIndexKey: see above.
    return index % 2 === 1 ? <sup key={index}>{lowered}</sup> : part;
  });
}
