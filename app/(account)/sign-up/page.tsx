import type { Metadata } from "next";
import Link from "next/link";
import { redirect } from "next/navigation";
import { SignUpForm } from "@/components/account/sign-up-form";
import { PageBody } from "@/components/site/page-body";
import { currentPerson } from "@/lib/auth/current-person";
import { safeReturnPath } from "@/lib/http";

export const metadata: Metadata = { title: "Sign up" };

export default async function SignUpPage({
  searchParams,
}: {
  searchParams: Promise<{ return?: string | string[] }>;
}) {
  const { return: asked } = await searchParams;
  const returnTo = safeReturnPath(typeof asked === "string" ? asked : null);
  if (await currentPerson()) redirect(returnTo);
  return (
    <PageBody width="narrow">
      <h1 className="mb-2 text-3xl">Sign up</h1>
      <p className="mb-6">
        An account is for writing. To read a version, to recompute it or to vary an input you need
        none.
      </p>
      <SignUpForm returnTo={returnTo} />
      <p className="mt-6 font-sans text-sm text-faint">
        <Link href={`/sign-in?return=${encodeURIComponent(returnTo)}`} className="link">
          I have an account
        </Link>
      </p>
    </PageBody>
  );
}
