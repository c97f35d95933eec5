import type { Me } from "@emberladder/contract";
import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { cleanup, render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { createMemoryRouter, RouterProvider } from "react-router-dom";
import { afterEach, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { z } from "zod";
import { RequireSession } from "../../../apps/web/src/app/require-session.tsx";
import { Form } from "../../../apps/web/src/components/forms/form.tsx";
import { TextField } from "../../../apps/web/src/components/forms/text-field.tsx";
import { ApiProblem } from "../../../apps/web/src/lib/api-client.ts";
import { leaveSession } from "../../../apps/web/src/lib/enter-session.ts";
import { SessionProvider, useMe } from "../../../apps/web/src/lib/session.tsx";
import { startWords } from "./start-words.ts";

const me = {
  person: { id: "p1", name: "Ibby Sorrel", email: "ibby@company.example", role: "senior" },
  company: { id: "c1", name: "Tamarack & Pike", unitsShown: "inch-pound" },
  twoStep: "off",
  deviceId: null,
} as unknown as Me;

const schema = z.strictObject({ name: z.string() });
const signedOut = () => new ApiProblem(401, "signed-out", "Sign in to go on.");

/** A page behind sign-in with one form; `session` is what the server says of who is signed in. */
function openPage(onSubmit: (values: { name: string }) => Promise<void>, path = "/customers/new") {
  const session: { me: Me | null } = { me };
  vi.stubGlobal("fetch", async (address: string) => {
    const isSignIn = address.endsWith("/sign-in");
    if (isSignIn) session.me = me;
    const body = session.me ?? { code: "signed-out", title: "Sign in to go on." };
    return new Response(JSON.stringify(body), {
      status: session.me ? 200 : 401,
      headers: { "content-type": "application/json" },
    });
  });
  const client = new QueryClient();
  const Page = () => (
    <>
      <p>{useMe().person.name}</p>
      <Form schema={schema} defaults={{ name: "" }} submitLabel="Save" onSubmit={onSubmit}>
        <TextField name="name" label="Name" />
      </Form>
    </>
  );
  const router = createMemoryRouter(
    [
      { path: "/sign-in", element: <h1>{"The sign-in screen"}</h1> },
      { element: <RequireSession />, children: [{ path, element: <Page /> }] },
    ],
    { initialEntries: [path] },
  );
  render(
    <QueryClientProvider client={client}>
      <SessionProvider>
        <RouterProvider router={router} />
      </SessionProvider>
    </QueryClientProvider>,
  );
  const endSession = async () => {
    session.me = null;
    await client.invalidateQueries({ queryKey: ["me"] });
  };
  return { user: userEvent.setup(), client, endSession };
}

// UX-23: a session that ends costs nobody what they typed.
describe("a session that ends while a form is half filled in", () => {
  beforeAll(async () => {
    await startWords();
    // jsdom draws no dialogs.
    HTMLDialogElement.prototype.showModal = function open() {
      this.setAttribute("open", "");
    };
    HTMLDialogElement.prototype.close = function close() {
      this.removeAttribute("open");
      this.dispatchEvent(new Event("close"));
    };
  });
  beforeEach(() => localStorage.clear());
  afterEach(() => {
    cleanup();
    vi.unstubAllGlobals();
  });

  it("keeps the page and what was typed, and asks for the password over it", async () => {
    const { user, endSession } = openPage(async () => undefined);
    await user.type(await screen.findByLabelText("Name"), "Odalys");
    await endSession();
    expect(await screen.findByRole("dialog", { name: "Sign in again" })).toBeTruthy();
    expect(screen.getByLabelText<HTMLInputElement>("Name").value).toBe("Odalys");
    await user.type(screen.getByLabelText("Password"), "nine invented words here");
    await user.click(screen.getByRole("button", { name: "Sign in" }));
    await waitFor(() => expect(screen.queryByRole("dialog")).toBeNull());
    expect(screen.getByLabelText<HTMLInputElement>("Name").value).toBe("Odalys");
  });

  it("sends the form once more after signing in, where the server took it for nobody's", async () => {
    const onSubmit = vi.fn<(values: { name: string }) => Promise<void>>();
    onSubmit.mockRejectedValueOnce(signedOut()).mockResolvedValue(undefined);
    const { user } = openPage(onSubmit);
    await user.type(await screen.findByLabelText("Name"), "Odalys");
    await user.click(screen.getByRole("button", { name: "Save" }));
    await user.type(await screen.findByLabelText("Password"), "nine invented words here");
    await user.click(screen.getByRole("button", { name: "Sign in" }));
    await waitFor(() => expect(onSubmit).toHaveBeenCalledTimes(2));
    expect(onSubmit.mock.calls.map(([values]) => values)).toEqual([{ name: "Odalys" }, { name: "Odalys" }]);
    await waitFor(() => expect(screen.queryByRole("dialog")).toBeNull());
    expect(screen.queryByRole("alert")).toBeNull();
  });

  it("says so and keeps the form where signing in is put off", async () => {
    const { user } = openPage(async () => Promise.reject(signedOut()));
    await user.type(await screen.findByLabelText("Name"), "Odalys");
    await user.click(screen.getByRole("button", { name: "Save" }));
    await user.click(await screen.findByRole("button", { name: "Not now" }));
    expect((await screen.findByRole("alert")).textContent).toContain("You are signed out.");
    expect(screen.getByLabelText<HTMLInputElement>("Name").value).toBe("Odalys");
  });

  it("leads to the sign-in screen where nothing was typed", async () => {
    const { endSession } = openPage(async () => undefined);
    await screen.findByLabelText("Name");
    await endSession();
    expect(await screen.findByText("The sign-in screen")).toBeTruthy();
  });

  it("leads to the sign-in screen where the person signed out themselves, whatever was typed", async () => {
    const { user, client } = openPage(async () => undefined);
    await user.type(await screen.findByLabelText("Name"), "Odalys");
    leaveSession(client);
    expect(await screen.findByText("The sign-in screen")).toBeTruthy();
  });

  it("sends nobody away from a visit, whose record is on the phone", async () => {
    const { endSession } = openPage(async () => undefined, "/diagnoses/d1/check");
    await screen.findByLabelText("Name");
    await endSession();
    await waitFor(() => expect(localStorage.getItem("emberladder.me")).toBeNull());
    expect(screen.getByText("Ibby Sorrel")).toBeTruthy();
    expect(screen.queryByText("The sign-in screen")).toBeNull();
    expect(screen.queryByRole("dialog")).toBeNull();
  });
});
