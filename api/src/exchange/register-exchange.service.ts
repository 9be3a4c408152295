import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { contentOf } from '../revisions/content.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { searchTextOf } from '../revisions/search-text.js';
import type { ImportedRegister } from './dto/imported-register.dto.js';
import { journalFaults } from './former-journal.js';
import { JournalsReadModel } from './journals.read-model.js';
import { readForm } from './read-form.js';
import { RegisterExportReadModel } from './register-export.read-model.js';
import { definitionOf, registerFaults } from './register-faults.js';
import { registerFile } from './register-file.mapper.js';
import { ExchangedRegister } from './register-format.js';
import { RegisterImportRepository } from './register-import.repository.js';

/** Whole registers as files, out and in. What comes in is what went out: no record gets another time, name or hash. */
@Injectable()
export class RegisterExchangeService {
  constructor(
    private readonly records: RegisterExportReadModel,
    private readonly journals: JournalsReadModel,
    private readonly imports: RegisterImportRepository,
    private readonly revisions: RevisionsService,
    private readonly writer: Writer,
  ) {}

  /**
   * The register as it is. This office's journal goes along once it tells of the register; an office that has only
   * brought a register in hands on what it got.
   */
  file(): ExchangedRegister {
    const own = this.journals.actedOnRegister() ? [this.journals.own()] : [];
    const journals = [...this.journals.former(), ...own];
    return registerFile(this.records.rows(), journals, (id) => this.revisions.nameOf(id));
  }

  /** Brings a register in, where there is none yet. Throws `malformed` with each fault, `conflict` where there is one. */
  bring(actor: Actor, value: unknown): ImportedRegister {
    const register = readForm(ExchangedRegister, value);
    const fields = [
      ...registerFaults(register),
      ...register.journals.flatMap((journal, i) => journalFaults(journal, `journals.${i}`)),
    ];
    if (fields.length > 0)
      throw new ApiProblem('malformed', 'The register in the file does not hold.', { fields });
    return this.writer.write(actor, 'register.imported', (tx) => {
      if (!this.imports.isEmpty(tx)) {
        throw new ApiProblem(
          'conflict',
          'This register is not empty: a whole one comes into an empty one only.',
        );
      }
      this.write(tx, register);
      const result = countsOf(register);
      return { subject: 'register', detail: { ...result, content: contentOf(register).hash }, result };
    });
  }

  private write(tx: Tx, register: ExchangedRegister): void {
    for (const geometry of register.geometries) this.writeGeometry(tx, geometry);
    for (const person of register.people) this.imports.insertPerson(tx, person);
    for (const equation of register.propertyEquations) this.imports.insertPropertyEquation(tx, equation);
    const names = new Map(register.geometries.map(({ slug, name }) => [slug, name]));
    for (const correlation of register.correlations) {
      this.imports.insertCorrelation(tx, correlation);
      const name = names.get(correlation.geometry) ?? correlation.geometry;
      this.index(tx, this.revisions.all('correlation', correlation.slug, tx), correlation.revisions, name);
    }
    for (const [i, journal] of register.journals.entries()) this.imports.insertJournal(tx, i + 1, journal);
  }

  private index(
    tx: Tx,
    records: readonly RevisionRecord[],
    revisions: ExchangedRegister['correlations'][number]['revisions'],
    geometryName: string,
  ): void {
    for (const record of records) {
      const text = revisions[record.number - 1]?.contents.at(-1)?.text;
      if (text !== undefined) {
        this.revisions.setSearchText(tx, record, searchTextOf(definitionOf(text), geometryName));
      }
    }
  }

  private writeGeometry(tx: Tx, geometry: ExchangedRegister['geometries'][number]): void {
    const here = this.imports.geometry(tx, geometry.slug);
    if (here === undefined) {
      this.imports.insertGeometry(tx, geometry);
      return;
    }
    const same = (Object.keys(geometry) as (keyof typeof geometry)[]).every(
      (name) => JSON.stringify(geometry[name]) === JSON.stringify(here[name]),
    );
    if (!same) {
      throw new ApiProblem('conflict', `The geometry "${geometry.slug}" is described otherwise here.`);
    }
  }
}

function countsOf({
  geometries,
  correlations,
  propertyEquations,
  journals,
}: ExchangedRegister): ImportedRegister {
  const revisions = [...correlations, ...propertyEquations].reduce(
    (sum, one) => sum + one.revisions.length,
    0,
  );
  return {
    geometries: geometries.length,
    correlations: correlations.length,
    propertyEquations: propertyEquations.length,
    revisions,
    journalEntries: journals.reduce((sum, { entries }) => sum + entries.length, 0),
  };
}
