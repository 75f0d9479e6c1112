import Link from "next/link";
import { SignOutButton } from "./sign-out-button";
import { SiteLink } from "./site-link";

/** The name of the house, its rooms, and the account. */
export function SiteHeader({ person }: { person: { name: string } | null }) {
  return (
    <header className="no-print">
      <div className="spectrum" aria-hidden="true" />
      <div className="mx-auto flex w-full max-w-page flex-wrap items-baseline gap-x-8 gap-y-1 px-4 py-3 sm:px-8">
        <Link href="/" className="w-full text-xl font-semibold tracking-tight sm:w-auto">
          Leading <i className="font-normal">Order</i>
        </Link>
        <nav
          aria-label="Main"
          className="flex flex-1 flex-wrap items-baseline gap-x-6 gap-y-1 font-sans text-sm"
        >
          {person && <SiteLink href="/desk">Desk</SiteLink>}
          <SiteLink href="/constants">Constants</SiteLink>
          <SiteLink href="/help">Help</SiteLink>
          <span className="flex flex-wrap items-baseline gap-x-6 gap-y-1 sm:ml-auto">
            {person ? (
              <>
                <SiteLink href="/settings">{person.name}</SiteLink>
                <SignOutButton />
              </>
            ) : (
              <>
                <SiteLink href="/sign-in">Sign in</SiteLink>
                <SiteLink href="/sign-up">Sign up</SiteLink>
              </>
            )}
          </span>
        </nav>
      </div>
    </header>
  );
}
