import type { Metadata } from "next";
import { ResetRequestForm } from "@/components/account/reset-request-form";
import { PageBody } from "@/components/site/page-body";

export const metadata: Metadata = { title: "Forgotten password" };

export default function ResetPage() {
  return (
    <PageBody width="narrow">
      <h1 className="mb-2 text-3xl">Forgotten password</h1>
      <p className="mb-6">
        Give the address of your account. A link to set a new one comes by mail.
      </p>
      <ResetRequestForm />
    </PageBody>
  );
}
