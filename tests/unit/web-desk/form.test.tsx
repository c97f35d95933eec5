import { cleanup, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { z } from "zod";
import { Form } from "../../../apps/web/src/components/forms/form.tsx";
import { NumberField } from "../../../apps/web/src/components/forms/number-field.tsx";
import { TextField } from "../../../apps/web/src/components/forms/text-field.tsx";
import { ApiProblem } from "../../../apps/web/src/lib/api-client.ts";
import { startWords } from "./start-words.ts";

const schema = z.strictObject({
  name: z.string().trim().min(1, "Enter a name."),
  pressure: z.number().positive().max(14).optional(),
  note: z.string().nullable(),
});

type Submit = (values: z.output<typeof schema>) => Promise<void>;

function renderForm(onSubmit: Submit) {
  document.title = "New unit";
  render(
    <Form schema={schema} defaults={{ name: "", note: null }} submitLabel="Save the unit" onSubmit={onSubmit}>
      <TextField name="name" label="Name" hint="As people on site call it." />
      <NumberField name="pressure" label="Manifold" unit="in. w.c." />
      <TextField name="note" label="Note" empty="null" />
    </Form>,
  );
  return { user: userEvent.setup(), send: () => screen.getByRole("button", { name: "Save the unit" }) };
}

// Quality criteria UX-17, UX-18, UX-20; the pattern of summary, link and title is that of GOV.UK Validation.
describe("a form of the desk", () => {
  beforeAll(startWords);
  beforeEach(() => vi.restoreAllMocks());
  afterEach(cleanup);

  it("says nothing while a field is left empty, and only judges when it is sent", async () => {
    const { user } = renderForm(async () => undefined);
    await user.click(screen.getByLabelText("Name"));
    await user.tab();
    expect(screen.queryByRole("alert")).toBeNull();
  });

  it("puts the focus on a summary that names each field when it is sent with errors", async () => {
    const { user, send } = renderForm(async () => undefined);
    await user.type(screen.getByLabelText("Manifold"), "about three");
    await user.click(send());
    const summary = await screen.findByRole("alert");
    await vi.waitFor(() => expect(document.activeElement).toBe(summary));
    expect(screen.getByRole("link", { name: "Name: Enter a name." })).toBeTruthy();
    expect(screen.getByRole("link", { name: "Manifold: Enter a number." })).toBeTruthy();
    await vi.waitFor(() => expect(document.title).toBe("Error: New unit"));
  });

  it("moves the focus to the field whose link in the summary is followed", async () => {
    const { user, send } = renderForm(async () => undefined);
    window.HTMLElement.prototype.scrollIntoView = () => undefined;
    await user.click(send());
    await user.click(await screen.findByRole("link", { name: /^Name/ }));
    expect(document.activeElement).toBe(screen.getByLabelText("Name"));
  });

  it("ties the message and the hint to the field that is at fault", async () => {
    const { user, send } = renderForm(async () => undefined);
    await user.click(send());
    await screen.findByRole("alert");
    const field = screen.getByLabelText("Name");
    const described = (field.getAttribute("aria-describedby") ?? "").split(" ");
    expect(field.getAttribute("aria-invalid")).toBe("true");
    expect(described.map((id) => document.getElementById(id)?.textContent)).toEqual([
      "As people on site call it.",
      "Enter a name.",
    ]);
  });

  it("keeps everything that was typed when it is refused, also what is no number", async () => {
    const { user, send } = renderForm(async () => undefined);
    await user.type(screen.getByLabelText("Manifold"), "3,5x");
    await user.type(screen.getByLabelText("Note"), "Read it twice");
    await user.click(send());
    await screen.findByRole("alert");
    expect(screen.getByLabelText<HTMLInputElement>("Manifold").value).toBe("3,5x");
    expect(screen.getByLabelText<HTMLInputElement>("Note").value).toBe("Read it twice");
  });

  it("sends a comma as a decimal point, an empty number as absent and an empty text as null", async () => {
    const onSubmit = vi.fn<Submit>(async () => undefined);
    const { user, send } = renderForm(onSubmit);
    await user.type(screen.getByLabelText("Name"), "  Furnace 1 ");
    await user.type(screen.getByLabelText("Manifold"), "3,5");
    await user.click(send());
    await vi.waitFor(() => expect(onSubmit).toHaveBeenCalledOnce());
    expect(onSubmit).toHaveBeenLastCalledWith({ name: "Furnace 1", pressure: 3.5, note: null });
    await user.clear(screen.getByLabelText("Manifold"));
    await user.click(send());
    await vi.waitFor(() => expect(onSubmit).toHaveBeenCalledTimes(2));
    expect(onSubmit).toHaveBeenLastCalledWith({ name: "Furnace 1", note: null });
  });

  it("names the limit when a number is beyond it, and takes the limit itself", async () => {
    const onSubmit = vi.fn<Submit>(async () => undefined);
    const { user, send } = renderForm(onSubmit);
    await user.type(screen.getByLabelText("Name"), "Furnace 1");
    await user.type(screen.getByLabelText("Manifold"), "14.1");
    await user.click(send());
    expect(await screen.findByRole("link", { name: "Manifold: Enter 14 or less." })).toBeTruthy();
    await user.clear(screen.getByLabelText("Manifold"));
    await user.type(screen.getByLabelText("Manifold"), "14");
    await user.click(send());
    await vi.waitFor(() => expect(onSubmit).toHaveBeenCalledOnce());
    await vi.waitFor(() => expect(screen.queryByRole("alert")).toBeNull());
    await vi.waitFor(() => expect(document.title).toBe("New unit"));
  });

  it("sends once when the button is tapped five times", async () => {
    let finish: () => void = () => undefined;
    const onSubmit = vi.fn<Submit>(() => new Promise<void>((resolve) => (finish = resolve)));
    const { user, send } = renderForm(onSubmit);
    await user.type(screen.getByLabelText("Name"), "Furnace 1");
    const button = send();
    for (let tap = 0; tap < 5; tap++) button.click();
    await vi.waitFor(() => expect(onSubmit).toHaveBeenCalled());
    button.click();
    finish();
    await screen.findByRole("button", { name: "Save the unit" });
    expect(onSubmit).toHaveBeenCalledOnce();
  });

  it("shows a refusal of the server at the field it names and as a whole, with what was typed still there", async () => {
    const { user, send } = renderForm(async () => {
      throw new ApiProblem(422, "profile-impossible", "No real unit has this combination.", undefined, [
        { path: "pressure", message: "The plate says less." },
      ]);
    });
    await user.type(screen.getByLabelText("Name"), "Furnace 1");
    await user.click(send());
    const summary = await screen.findByRole("alert");
    await vi.waitFor(() => expect(document.activeElement).toBe(summary));
    expect(summary.textContent).toContain("No real unit has this combination.");
    expect(screen.getByRole("link", { name: "Manifold: The plate says less." })).toBeTruthy();
    expect(screen.getByLabelText<HTMLInputElement>("Name").value).toBe("Furnace 1");
  });

  it("says that there is no signal, and that nothing is lost, when the server is not reached", async () => {
    const { user, send } = renderForm(async () => {
      throw new ApiProblem(0, "offline", "No signal.");
    });
    await user.type(screen.getByLabelText("Name"), "Furnace 1");
    await user.click(send());
    expect((await screen.findByRole("alert")).textContent).toContain("No signal.");
  });
});
