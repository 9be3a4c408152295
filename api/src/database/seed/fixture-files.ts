import { readdirSync, readFileSync } from 'node:fs';
import { basename, join } from 'node:path';
import { parse } from 'yaml';
import {
  checkPropertyStructure,
  checkStructure,
  type CorrelationDefinition,
  type Problem,
  type PropertyEquationDefinition,
} from '@merestone/engine';
import { isRole, type Role } from '../../common/roles.js';
import { inRepository } from '../../config/paths.js';
import type { Geometry } from '../../geometries/geometries.read-model.js';
import type { DemoLife } from './demo-life.js';
import type { StartingStanding } from './standing-rule.js';

export interface Named<T> {
  readonly slug: string;
  readonly definition: T;
}

export interface DemoPerson {
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
}

/** Standings that the rule does not give, by slug. */
export type Exceptions = Readonly<Record<string, StartingStanding>>;

/** The library as it lies in the repository's fixtures folder. A file that cannot be used is named in the error. */
export class FixtureFiles {
  constructor(private readonly folder: string = inRepository('fixtures')) {}

  geometries(): Geometry[] {
    return this.read('geometries.yaml') as Geometry[];
  }

  propertyEquations(): Named<PropertyEquationDefinition>[] {
    return this.definitions('properties', checkPropertyStructure);
  }

  correlations(): Named<CorrelationDefinition>[] {
    return this.names('correlations').flatMap((geometry) =>
      this.definitions(join('correlations', geometry), checkStructure),
    );
  }

  people(): DemoPerson[] {
    const people = this.read('demo/people.yaml') as DemoPerson[];
    return people.map(({ name, email, roles }) => ({ name, email, roles: roles.filter(isRole) }));
  }

  office(): { name: string; principal: string } {
    return this.read('demo/office.yaml') as { name: string; principal: string };
  }

  /** What happens in the demo office after its library was brought in. */
  demoLife(): DemoLife {
    return this.read('demo/life.yaml') as DemoLife;
  }

  exceptions(): { correlations: Exceptions; propertyEquations: Exceptions } {
    return this.read('demo/standings.yaml') as { correlations: Exceptions; propertyEquations: Exceptions };
  }

  private definitions<T>(
    folder: string,
    check: (value: unknown) => { ok: true; definition: T } | { ok: false; problems: Problem[] },
  ): Named<T>[] {
    return this.names(folder)
      .filter((name) => name.endsWith('.yaml'))
      .map((name) => {
        const structure = check(this.read(join(folder, name)));
        if (structure.ok) return { slug: basename(name, '.yaml'), definition: structure.definition };
        const faults = structure.problems.map(({ field, message }) => `  ${field}: ${message}`);
        throw new Error([`${join(folder, name)} is not a sheet:`, ...faults].join('\n'));
      });
  }

  private names(folder: string): string[] {
    return readdirSync(join(this.folder, folder)).sort();
  }

  private read(file: string): unknown {
    return parse(readFileSync(join(this.folder, file), 'utf8'));
  }
}
