export interface TextPiece {
  text: string;
  /** Path of this application that the piece is the address of. */
  to: string | null;
}

const ADDRESS = /(https?:\/\/[^\s<>"]+)/;

/** A letter's text, with the addresses of this office told apart; any other address stays plain text. */
export function textWithLinks(text: string, origin: string): TextPiece[] {
  return text
    .split(ADDRESS)
    .filter((piece) => piece !== '')
    .map((piece) => ({ text: piece, to: pathOf(piece, origin) }));
}

function pathOf(piece: string, origin: string): string | null {
  if (!ADDRESS.test(piece)) return null;
  try {
    const url = new URL(piece);
    return url.origin === origin ? `${url.pathname}${url.search}` : null;
  } catch {
    return null;
  }
}
