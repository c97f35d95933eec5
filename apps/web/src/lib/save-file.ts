/** Hands a text to the browser as a file to keep. The mark at its start tells spreadsheets that it is UTF-8. */
export function saveFile(name: string, type: "text/csv" | "application/json", text: string): void {
  const mark = type === "text/csv" ? "\uFEFF" : "";
  const address = URL.createObjectURL(new Blob([mark + text], { type: `${type};charset=utf-8` }));
  const link = document.createElement("a");
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
