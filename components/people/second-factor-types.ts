import type { ActionResult } from '@/lib/errors'

/** What sets an authenticator up. */
export interface AuthenticatorSetup {
  /** In groups of four letters. */
  secret: string
  /** The `otpauth:` address. */
  uri: string
  /** The `data:` address of the same as a picture. */
  picture: string
}

/** A password, and a code where one is asked for. */
export interface Proof {
  password: string
  code: string
}

type Prove<Input, Data> = (input: Input) => Promise<ActionResult<Data>>

/** What can be done about a second factor. */
export interface SecondFactorActions {
  begin: Prove<{ password: string; code?: string }, AuthenticatorSetup>
  confirm: Prove<{ code: string }, { recoveryCodes: string[] }>
  renew: Prove<Proof, { recoveryCodes: string[] }>
  remove: Prove<Proof, void>
}
