// Citation.js carries no types; these are of the part that is used here.

declare module '@citation-js/core' {
  interface InputPlugins {
    /** Runs one parser on its input, and nothing after it. */
    data(input: unknown, type: string): unknown;
    hasDataParser(type: string, async: boolean): unknown;
    remove(type: string): void;
    list(): string[];
  }

  interface OutputPlugins {
    format(name: string, items: readonly object[], options: { format: 'object' }): unknown;
  }

  interface BibtexConfig {
    readonly format: { asciiOnly: boolean };
    readonly constants: Readonly<
      Record<
        | 'commands'
        | 'mathCommands'
        | 'diacritics'
        | 'formattingCommands'
        | 'formattingEnvs'
        | 'argumentCommands'
        | 'mathScriptFormatting',
        Readonly<Record<string, unknown>>
      >
    >;
  }

  export const plugins: {
    readonly input: InputPlugins;
    readonly output: OutputPlugins;
    readonly config: { get(reference: '@bibtex'): BibtexConfig };
  };
}

declare module '@citation-js/plugin-bibtex';
declare module '@citation-js/plugin-ris';
