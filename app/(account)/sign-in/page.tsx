import type { Metadata } from "next";
import Link from "next/link";
import { redirect } from "next/navigation";
import { SignInForm } from "@/components/account/sign-in-form";
import { PageBody } from "@/components/site/page-body";
import { currentPerson } from "@/lib/auth/current-person";
import { safeReturnPath } from "@/lib/http";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInPage({
  searchParams,
}: {
  searchParams: Promise<{ return?: string | string[] }>;
}) {
  const { return: asked } = await searchParams;
  const returnTo = safeReturnPath(typeof asked === "string" ? asked : null);
  if (await currentPerson()) redirect(returnTo);
  return (
    <PageBody width="narrow">
      <h1 className="mb-6 text-3xl">Sign in</h1>
      <SignInForm returnTo={returnTo} />
      <p className="mt-6 font-sans text-sm text-faint">
        <Link href="/reset" className="link">
          I forgot the password
        </Link>
        {" · "}
        <Link href={`/sign-up?return=${encodeURIComponent(returnTo)}`} className="link">
          I have no account yet
        </Link>
      </p>
    </PageBody>
  );
}
