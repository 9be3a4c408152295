/** Something to be looked after as time goes by. Running it twice for the same moment must do nothing more. */
export interface ScheduledTask {
  /** For the log. */
  readonly name: string;
  run(at: Date): void | Promise<void>;
}
