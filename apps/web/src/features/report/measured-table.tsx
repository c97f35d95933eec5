import type { ReportContent } from "@emberladder/contract";
import { useTranslation } from "react-i18next";

/** What was measured: what it was, what it should be, and what that means in a word. */
export function MeasuredTable({ rows }: { rows: ReportContent["measured"] }) {
  const { t } = useTranslation();
  return (
    <div role="region" aria-label={t("desk:report.measured")} tabIndex={0} className="overflow-x-auto">
      <table className="w-full border-collapse text-left text-field">
        <thead>
          <tr className="border-b-2 border-ink align-bottom">
            <th scope="col" className="py-2 pr-3 font-semibold">
              {t("desk:report.what")}
            </th>
            <th scope="col" className="py-2 pr-3 font-semibold">
              {t("desk:report.was")}
            </th>
            <th scope="col" className="py-2 font-semibold">
              {t("desk:report.shouldBe")}
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr
              key={`${row.what} ${row.reading}`}
              className="break-inside-avoid border-b border-hair align-top last:border-b-0"
            >
              <th scope="row" className="py-2 pr-3 font-normal">
                {row.what}
              </th>
              <td className="py-2 pr-3">
                <span className="numeric font-semibold whitespace-nowrap">{row.reading}</span>
                <span className="block text-quiet">{row.verdict}</span>
              </td>
              <td className="py-2">{row.expected}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
