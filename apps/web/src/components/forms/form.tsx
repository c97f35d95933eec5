import { createContext, useContext, useEffect, useId, useRef } from "react";
import type { ReactNode } from "react";
import { FormProvider, useForm } from "react-hook-form";
import type { DefaultValues, FieldPath, FieldValues } from "react-hook-form";
import { useTranslation } from "react-i18next";
import { ApiProblem } from "#lib/api-client.ts";
import { markHalfTyped } from "#lib/half-typed.ts";
import { useProblemWords } from "#lib/problem-words.ts";
import { askToSignIn } from "#lib/sign-in-again.ts";
import { ErrorSummary } from "./error-summary.tsx";
import { listErrors } from "./list-errors.ts";
import { resolveBy } from "./resolve-by.ts";
import type { SchemaSource } from "./resolve-by.ts";
import { SubmitButton } from "./submit-button.tsx";
import { useIssueWords } from "./use-issue-words.ts";

const FormIdContext = createContext("form");

/** Id of a field's control, for its label, its messages and the links of the summary. */
export function useControlId(name: string): string {
  return `${useContext(FormIdContext)}-${name}`;
}

/**
 * A form as the whole product has it: judged by a contract's schema when it is sent and never before, so that
 * nobody is told off while typing. What was typed stays. Where something has to be mended, a summary comes on
 * top with the focus and a link to each field, each field says it too, and the page's title begins with the
 * word for error. Refusals of the server land in the same places. A second tap while sending does nothing. Where
 * the session has ended, the person signs in again over the page, and the form is sent then.
 */
export function Form<Input extends FieldValues, Output>({
  schema,
  defaults,
  submitLabel,
  onSubmit,
  submitKind = "solid",
  isForSignIn = false,
  aside,
  children,
}: {
  /** The schema, or how to fetch it: it is asked for at once and needed when the form is sent. */
  schema: SchemaSource<Input, Output>;
  defaults: DefaultValues<Input>;
  /** Says what is stored or done. */
  submitLabel: string;
  /** @throws ApiProblem to have it shown; anything else is a fault of ours. */
  onSubmit: (values: Output) => Promise<void>;
  /** Plain where the screen has its one solid act elsewhere. */
  submitKind?: "solid" | "plain";
  /** Set where it is how people sign in, so that nobody is asked to sign in for it. */
  isForSignIn?: boolean;
  /** Second acts beside the button. */
  aside?: ReactNode;
  children: ReactNode;
}) {
  const { t } = useTranslation();
  const formId = useId();
  const issueWords = useIssueWords();
  const problemWords = useProblemWords();
  const isFocusDue = useRef(false);
  const summary = useRef<HTMLDivElement>(null);
  const sending = useRef(false);
  const form = useForm<Input, unknown, Output>({
    resolver: resolveBy(schema, issueWords),
    defaultValues: defaults,
    mode: "onSubmit",
    reValidateMode: "onSubmit",
    shouldFocusError: false,
  });
  const errors = listErrors(form.formState.errors);
  const hasErrors = errors.length > 0;
  const isHalfTyped = form.formState.isDirty && !isForSignIn;

  useEffect(() => {
    // A failed fetch is tried again, and told, when the form is sent.
    if (typeof schema === "function") void schema().catch(() => undefined);
  }, [schema]);
  useEffect(() => {
    markHalfTyped(formId, isHalfTyped);
    return () => markHalfTyped(formId, false);
  }, [formId, isHalfTyped]);
  useEffect(() => {
    // The errors are drawn in one of the renders after they were found, so the focus waits for them.
    if (!isFocusDue.current || !summary.current) return;
    isFocusDue.current = false;
    summary.current.focus();
  });
  useEffect(() => {
    if (!hasErrors) return undefined;
    const before = document.title;
    document.title = t("desk:form.errorTitle", { title: before });
    return () => {
      document.title = before;
    };
  }, [hasErrors, t]);

  const showProblem = (problem: unknown) => {
    // What is no answer of the server is a fault of ours, and has to be found.
    if (!(problem instanceof ApiProblem)) console.error(problem);
    const fields = problem instanceof ApiProblem ? problem.fields : [];
    for (const { path, message } of fields)
      form.setError(path as FieldPath<Input>, { type: "server", message });
    form.setError("root.server", { type: "server", message: problemWords(problem) });
    isFocusDue.current = true;
  };
  const submit = async () => {
    if (sending.current) return;
    sending.current = true;
    const send = form.handleSubmit(
      (values) => onSubmit(values),
      () => {
        isFocusDue.current = true;
      },
    );
    try {
      await send().catch(async (problem: unknown) => {
        if (isForSignIn || !isSignedOut(problem) || !(await askToSignIn())) throw problem;
        await send();
      });
    } catch (problem) {
      showProblem(problem);
    } finally {
      sending.current = false;
    }
  };

  return (
    <FormIdContext value={formId}>
      <FormProvider {...form}>
        <form
          noValidate
          className="flex flex-col gap-5"
          onSubmit={(event) => {
            event.preventDefault();
            event.stopPropagation();
            void submit();
          }}
        >
          {hasErrors && <ErrorSummary ref={summary} errors={errors} />}
          {children}
          <div className="flex flex-wrap items-center gap-4">
            <SubmitButton kind={submitKind} busy={form.formState.isSubmitting}>
              {submitLabel}
            </SubmitButton>
            {aside}
          </div>
        </form>
      </FormProvider>
    </FormIdContext>
  );
}

function isSignedOut(problem: unknown): boolean {
  return problem instanceof ApiProblem && problem.code === "signed-out";
}
