const LOST = new Set(['ECONNECTION', 'ETIMEDOUT', 'EDNS', 'ESOCKET', 'EPROTOCOL', 'ETLS', 'EAUTH']);
const ABOUT_THIS_LETTER = new Set(['EENVELOPE', 'EMESSAGE']);

interface MailError {
  readonly code: unknown;
  readonly responseCode: unknown;
}

/** Whether the mail server said of this very letter that it will never take it (RFC 5321, 4.2.1: 5yz). */
export function isRefusedForGood(error: unknown): boolean {
  const { code, responseCode } = partsOf(error);
  return ABOUT_THIS_LETTER.has(String(code)) && typeof responseCode === 'number' && responseCode >= 500;
}

/** Whether the server cannot be spoken to at all, so that the other letters had better wait. */
export function isConnectionLost(error: unknown): boolean {
  return LOST.has(String(partsOf(error).code));
}

function partsOf(error: unknown): MailError {
  if (!(error instanceof Error)) return { code: undefined, responseCode: undefined };
  return {
    code: 'code' in error ? error.code : undefined,
    responseCode: 'responseCode' in error ? error.responseCode : undefined,
  };
}
