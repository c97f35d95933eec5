import { readReport, readReportPdf, addressOf } from "@emberladder/contract";
import type { AnswerOf } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import type { ReactNode } from "react";
import { useTranslation } from "react-i18next";
import { useParams } from "react-router-dom";
import { ActButton, actClass } from "#components/ui/act.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { callApi } from "#lib/api-client.ts";
import { formatDay } from "#lib/site-time.ts";
import { useTitle } from "#lib/use-title.ts";
import { BeforeAndNow } from "./before-and-now.tsx";
import { MeasuredTable } from "./measured-table.tsx";

type Report = AnswerOf<typeof readReport>;

/** The customer's report at its private link: read without an account, printed as it stands. */
export function ReportScreen() {
  const { t } = useTranslation();
  const { token = "" } = useParams();
  const report = useQuery({
    queryKey: ["report", token],
    queryFn: ({ signal }) => callApi(readReport, { params: { token }, signal }),
    staleTime: Infinity,
  });
  useTitle(t("desk:report.title"));
  if (report.isPending) return <LoadingNote />;
  if (report.isError) {
    return (
      <main>
        <h1 className="sr-only">{t("desk:report.title")}</h1>
        <ProblemNote problem={report.error} onRetry={() => void report.refetch()} />
      </main>
    );
  }
  return <ReportPage report={report.data} pdfAddress={addressOf(readReportPdf, { token })} />;
}

function ReportPage({ report, pdfAddress }: { report: Report; pdfAddress: string }) {
  const { t } = useTranslation();
  return (
    <div className="mx-auto max-w-160 desk:my-6 desk:border-2 desk:border-ink print:m-0 print:max-w-none print:border-0">
      <header className="flex items-center justify-between gap-3 border-b-3 border-ink bg-surface px-4 py-3">
        <p className="text-field font-semibold">{report.companyName}</p>
        {report.isDemo && (
          <span className="shrink-0 rounded border-2 border-ink px-2 text-label font-semibold">
            {t("desk:report.demo")}
          </span>
        )}
      </header>
      <main className="px-4 pb-8">
        <p className="mt-4 text-field text-quiet">
          {report.siteAddress}, {report.unitName}
          <br />
          {report.visited}
        </p>
        <h1 className="mt-3 text-[1.75rem] leading-9">{t(`desk:report.claims.${report.safe.state}`)}</h1>
        <BeforeAndNow state={report.safe.state} />
        <p className="text-field">{report.safe.text}</p>
        <Part title={t("desk:report.said")}>
          <p>{t("desk:calls.quote", { complaint: report.complaint })}</p>
        </Part>
        <Part title={t("desk:report.found")}>
          <Lines lines={report.found} />
        </Part>
        <Part title={t("desk:report.done")}>
          <Lines lines={report.done} />
        </Part>
        {report.measured.length > 0 && (
          <Part title={t("desk:report.measured")}>
            <MeasuredTable rows={report.measured} />
          </Part>
        )}
        <Part title={t("desk:report.next")}>
          <Lines lines={report.next} />
        </Part>
        {report.cautions.length > 0 && (
          <Part title={t("desk:report.cautions")}>
            <Lines lines={report.cautions} />
          </Part>
        )}
        <footer className="mt-6 border-t-3 border-ink pt-3 text-field">
          <p className="font-semibold">{t("desk:report.by", { name: report.technicianName })}</p>
          <div className="my-3 flex flex-wrap gap-3 print:hidden">
            <ActButton onClick={() => print()}>{t("desk:report.print")}</ActButton>
            {report.hasPdf && (
              <a href={pdfAddress} className={actClass("plain")} download>
                {t("desk:report.pdf")}
              </a>
            )}
          </div>
          <p className="text-quiet">
            {t("desk:report.link", { day: formatDay(report.linkHoldsUntil, "UTC", 0) })}
          </p>
          <p className="mt-2 text-label text-quiet">
            {t("desk:report.record", { number: report.callNumber })}{" "}
            <span className="numeric break-all">{report.recordHash}</span>
          </p>
        </footer>
      </main>
    </div>
  );
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mt-4 break-inside-avoid border-t border-hair pt-4 text-field">
      <h2 className="mb-1 font-semibold">{title}</h2>
      {children}
    </section>
  );
}

function Lines({ lines }: { lines: readonly string[] }) {
  return lines.map((line) => (
    <p key={line} className="mb-1 last:mb-0">
      {line}
    </p>
  ));
}
