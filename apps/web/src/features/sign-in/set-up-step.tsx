import type { Me } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { RecoveryCodes } from "#components/two-step/recovery-codes.tsx";
import { SetUpTwoStep } from "#components/two-step/set-up-two-step.tsx";
import { enterSession } from "#lib/enter-session.ts";

/** Set-up of two-step codes where the role needs them, then the recovery codes, which are shown once. */
export function SetUpStep({ onCodes, onDone }: { onCodes: () => void; onDone: () => void }) {
  const client = useQueryClient();
  const [made, setMade] = useState<{ recoveryCodes: string[]; me: Me } | null>(null);
  if (!made) {
    return (
      <SetUpTwoStep
        onConfirmed={(answer) => {
          onCodes();
          setMade(answer);
        }}
      />
    );
  }
  return (
    <RecoveryCodes
      codes={made.recoveryCodes}
      onKept={() => {
        enterSession(client, made.me);
        onDone();
      }}
    />
  );
}
