"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";

/** A link of the header; it is marked while its page is open. */
export function SiteLink({ href, children }: { href: string; children: string }) {
  const here = usePathname() === href;
  return (
    <Link
      href={href}
      aria-current={here ? "page" : undefined}
      className="inline-block max-w-[14rem] truncate py-1.5 underline-offset-[0.35em] hover:text-calcium hover:underline aria-[current=page]:underline aria-[current=page]:decoration-2"
    >
      {children}
    </Link>
  );
}
