const superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺";
const plain = "0123456789−+";
const raisedOrLowered = /([⁰¹²³⁴⁵⁶⁷⁸⁹⁻⁺]+|[⊙⊕])/u;

function onTheLine(raised: string): string {
  return [...raised].map((ch) => plain[superscripts.indexOf(ch)] ?? ch).join("");
}

/**
 * Text such as “10³⁹ M⊙ s⁻¹” with raised and lowered figures of the typeface in force. Copied, or
 * read aloud, an exponent keeps its `^`.
 */
export function Superscripts({ text }: { text: string }) {
  const parts = text.split(raisedOrLowered);
  return parts.map((part, index) => {
    const key = `${index}${part}`;
    if (index % 2 === 0) return part;
    if (part === "⊙" || part === "⊕") return <sub key={key}>{part}</sub>;
    return (
      <sup key={key}>
        {/* Of no size rather than out of the flow, which would break a copied line in three. */}
        <span className="text-[0px]">^</span>
        {onTheLine(part)}
      </sup>
    );
  });
}
