/** The secrets of a signature: they travel beside the command and are kept nowhere. */
export interface SigningSecrets {
  readonly pin: string;
  readonly password?: string;
}
