/** Cost of argon2id. The least that OWASP advises is 19 MiB, 2 passes, 1 lane. */
export interface PasswordCost {
  readonly memoryKiB: number;
  readonly passes: number;
  readonly lanes: number;
}

/** How many attempts at a password may fail within the window before everybody concerned must wait. */
export interface SignInLimits {
  readonly windowSeconds: number;
  readonly perAddress: number;
  readonly perPerson: number;
}

export interface SessionSpans {
  readonly idleMinutes: number;
  readonly absoluteHours: number;
}

/** All settings of the server, parsed once at the start. A class, so that it can be injected. */
export class Config {
  /** 0 takes any free port. */
  readonly port: number;
  readonly dataFolder: string;
  /** Whether a new database becomes the demo office. */
  readonly demo: boolean;
  /** Whether a new office that is no demo gets the library as drafts. Without it a register can be brought in. */
  readonly library: boolean;
  readonly smtpUrl: string | undefined;
  /** The address people use, when the server stands behind a proxy: scheme, host and port. */
  readonly origin: string | undefined;
  /** Where the built screens are; nothing is served when the folder is not there. */
  readonly webFolder: string;
  readonly passwordCost: PasswordCost;
  readonly signInLimits: SignInLimits;
  readonly sessionSpans: SessionSpans;

  constructor(settings: Settings) {
    this.port = settings.port;
    this.dataFolder = settings.dataFolder;
    this.demo = settings.demo;
    this.library = settings.library ?? true;
    this.smtpUrl = settings.smtpUrl;
    this.origin = settings.origin;
    this.webFolder = settings.webFolder;
    this.passwordCost = settings.passwordCost ?? { memoryKiB: 19 * 1024, passes: 2, lanes: 1 };
    this.signInLimits = settings.signInLimits ?? { windowSeconds: 300, perAddress: 50, perPerson: 10 };
    this.sessionSpans = settings.sessionSpans ?? { idleMinutes: 60, absoluteHours: 12 };
  }

  /** Whether people reach the server over TLS, as far as the settings say. */
  get secure(): boolean {
    return this.origin?.startsWith('https:') ?? false;
  }
}

export interface Settings {
  readonly port: number;
  readonly dataFolder: string;
  readonly demo: boolean;
  readonly library?: boolean;
  readonly smtpUrl?: string | undefined;
  readonly origin?: string | undefined;
  readonly webFolder: string;
  /** These three have no environment variable: only tests set them. */
  readonly passwordCost?: PasswordCost;
  readonly signInLimits?: SignInLimits;
  readonly sessionSpans?: SessionSpans;
}
