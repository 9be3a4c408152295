/** What is so, without the advice that follows it. */
export function firstSentence(message: string): string {
  return message.split(/(?<=\.)\s+(?=\p{Lu})/u)[0] ?? message;
}
