"use client";
import { signIn } from "next-auth/react";
import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";

/** What a refused sign-in says; the words do not tell whether the address is known. */
function refusalWords(code: string): string {
  if (code === "too-many-tries") return "Too many tries. Wait a quarter of an hour, then try again.";
  if (code === "CredentialsSignin") return "That e-mail and password do not belong together.";
  return "Signing in did not work just now. Try again; if it keeps failing, tell whoever runs this installation.";
}

interface Entries {
  readonly email: string;
  readonly password: string;
}

const missing = ({ email, password }: Entries) => ({
  email: email.trim() === "" ? "Write your e-mail address." : undefined,
  password: password === "" ? "Write your password." : undefined,
});

/** E-mail and password. What was typed stays after a refusal. */
export function SignInForm({ callbackPath }: { readonly callbackPath: string }) {
  const [entries, setEntries] = useState<Entries>({ email: "", password: "" });
  const [wasSent, setWasSent] = useState(false);
  const [isBusy, setIsBusy] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const errors: ReturnType<typeof missing> = wasSent
    ? missing(entries)
    : { email: undefined, password: undefined };

  const submit = async (event: FormEvent) => {
    event.preventDefault();
    setWasSent(true);
    const faults = missing(entries);
    if (isBusy || faults.email || faults.password) return;
    setIsBusy(true);
    setRefusal(null);
    const answer = await signIn("credentials", {
      ...entries,
      email: entries.email.trim(),
      redirect: false,
    }).catch(() => undefined);
    if (answer?.ok && !answer.error) {
      // A full load: nothing that was cached before signing in may show afterwards.
      window.location.assign(callbackPath);
      return;
    }
    setIsBusy(false);
    setRefusal(refusalWords(answer?.error ?? "unreachable"));
  };
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="mt-5 grid gap-4">
      {refusal ? (
        <Notice tone="fail" role="alert" title="Not signed in">
          <p>{refusal}</p>
        </Notice>
      ) : null}
      <TextField
        label="E-mail"
        type="email"
        name="email"
        autoComplete="username"
        value={entries.email}
        onChange={(event) => setEntries({ ...entries, email: event.target.value })}
        error={errors.email}
      />
      <TextField
        label="Password"
        type="password"
        name="password"
        autoComplete="current-password"
        value={entries.password}
        onChange={(event) => setEntries({ ...entries, password: event.target.value })}
        error={errors.password}
      />
      <div>
        <Button kind="primary" type="submit" isBusy={isBusy} busyLabel="Signing in">
          Sign in
        </Button>
      </div>
    </form>
  );
}
