import { createRequire } from "node:module";
import type { ReportContent } from "@emberladder/contract";
import PdfDocument from "pdfkit";

const require = createRequire(import.meta.url);
/** The font files that go into the PDF. */
export const PDF_FONTS = {
  text: require.resolve("@fontsource/ibm-plex-sans/files/ibm-plex-sans-latin-400-normal.woff"),
  strong: require.resolve("@fontsource/ibm-plex-sans/files/ibm-plex-sans-latin-600-normal.woff"),
};

/** Headings of the printed report, in English. */
export const PDF_WORDS = {
  title: "Furnace report",
  demo: "Invented example. Nothing in it was measured on a real unit.",
  complaint: "What you told us",
  found: "What was found",
  done: "What was done",
  measured: "What was measured",
  safe: "Is it safe",
  next: "What comes next",
  cautions: "Please keep in mind",
  expected: "expected",
  record: "Record",
};

const MARGIN = 54;

/** The customer's report as PDF: US letter, text that can be copied and read aloud, fonts inside. */
export async function renderReportPdf(content: ReportContent, madeAt: Date): Promise<Uint8Array> {
  const pdf = new PdfDocument({
    size: "LETTER",
    margin: MARGIN,
    lang: "en",
    tagged: true,
    displayTitle: true,
    info: {
      Title: `${PDF_WORDS.title}, call ${content.callNumber}`,
      Author: content.companyName,
      CreationDate: madeAt,
    },
  });
  const chunks: Buffer[] = [];
  const done = new Promise<void>((resolve, reject) => {
    pdf.on("data", (chunk: Buffer) => chunks.push(chunk));
    pdf.on("end", () => resolve());
    pdf.on("error", reject);
  });
  for (const [name, path] of Object.entries(PDF_FONTS)) pdf.registerFont(name, path);
  write(pdf, content);
  pdf.end();
  await done;
  return new Uint8Array(Buffer.concat(chunks));
}

function write(pdf: PDFKit.PDFDocument, content: ReportContent): void {
  const heading = (text: string) => pdf.moveDown(0.8).font("strong").fontSize(13).text(text).moveDown(0.2);
  const lines = (texts: readonly string[]) => {
    pdf.font("text").fontSize(11);
    for (const text of texts) pdf.text(text, { paragraphGap: 3 });
  };

  pdf.font("strong").fontSize(20).text(PDF_WORDS.title);
  lines([
    `${content.companyName}, call ${content.callNumber}`,
    content.visited,
    `${content.customerFirstName}, ${content.siteAddress}`,
    `${content.unitName}. ${content.technicianName}.`,
  ]);
  if (content.isDemo) pdf.moveDown(0.4).font("strong").fontSize(11).text(PDF_WORDS.demo);
  heading(PDF_WORDS.safe);
  lines([content.safe.text]);
  heading(PDF_WORDS.complaint);
  lines([content.complaint]);
  heading(PDF_WORDS.found);
  lines(content.found);
  heading(PDF_WORDS.done);
  lines(content.done);
  if (content.measured.length > 0) {
    heading(PDF_WORDS.measured);
    lines(
      content.measured.map(({ what, reading, expected, verdict }) =>
        [`${what}: ${reading}`, expected && `${PDF_WORDS.expected} ${expected}`, verdict]
          .filter(Boolean)
          .join("; "),
      ),
    );
  }
  heading(PDF_WORDS.next);
  lines(content.next);
  heading(PDF_WORDS.cautions);
  lines(content.cautions);
  pdf.moveDown(1).font("text").fontSize(8).text(`${PDF_WORDS.record} ${content.recordHash}`);
}
