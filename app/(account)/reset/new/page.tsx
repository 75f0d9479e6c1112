import type { Metadata } from "next";
import Link from "next/link";
import { ResetForm } from "@/components/account/reset-form";
import { PageBody } from "@/components/site/page-body";
import { Message } from "@/components/ui/message";

export const metadata: Metadata = { title: "New password", referrer: "no-referrer" };

export default async function NewPasswordPage({
  searchParams,
}: {
  searchParams: Promise<{ token?: string | string[] }>;
}) {
  const { token } = await searchParams;
  return (
    <PageBody width="narrow">
      <h1 className="mb-6 text-3xl">New password</h1>
      {typeof token === "string" && token !== "" ? (
        <ResetForm token={token} />
      ) : (
        <Message tone="error">
          This address lacks its token. Follow the link in the mail, or{" "}
          <Link href="/reset" className="link">
            ask for a new one
          </Link>
          .
        </Message>
      )}
    </PageBody>
  );
}
