import { compileCorrelation, type CorrelationDefinition } from '@merestone/engine';
import { vi } from 'vitest';
import type { Sheet } from '../../../shared/api/types';
import { idealGasDryAir } from '../../../shared/samples/gilliland-sherwood';
import { sampleSheet } from '../../../shared/samples/sheets';

export interface Asked {
  method: string;
  path: string;
  body: unknown;
  ifMatch: string | null;
}

/** Stands in for the server: one sheet, its content hash counted up, and the answers of the contract. */
export class DraftServer {
  readonly asked: Asked[] = [];
  /** Answers the next calls of a kind with a problem instead. */
  refuse: ((call: Asked) => { status: number; body: object } | null) | null = null;
  sheet: Sheet;
  private saves = 0;

  constructor(sheet: Sheet = draftSheet()) {
    this.sheet = sheet;
    vi.stubGlobal('fetch', (call: Request) => this.answer(call));
  }

  /** Somebody else's edit. */
  changeElsewhere(changes: Partial<CorrelationDefinition>): void {
    this.take({ ...this.sheet.definition, ...changes });
  }

  writes(): Asked[] {
    return this.asked.filter(({ method }) => method !== 'GET');
  }

  private take(definition: CorrelationDefinition): void {
    const compiled = compileCorrelation(definition);
    if (!compiled.ok) throw new Error('a draft that does not hold was sent');
    this.saves += 1;
    const hash = String(this.saves).padStart(64, '0');
    this.sheet = {
      ...this.sheet,
      definition,
      title: definition.title,
      hash,
      iteration: this.sheet.iteration + 1,
    };
  }

  private async answer(request: Request): Promise<Response> {
    const text = await request.text();
    const call: Asked = {
      method: request.method,
      path: new URL(request.url).pathname,
      body: text === '' ? null : JSON.parse(text),
      ifMatch: request.headers.get('if-match'),
    };
    this.asked.push(call);
    const refusal = this.refuse?.(call);
    return refusal ? json(refusal.status, refusal.body) : this.contract(call);
  }

  private contract({ method, path, body, ifMatch }: Asked): Response {
    const { definition, slug } = (body ?? {}) as { definition?: CorrelationDefinition; slug?: string };
    if (path === '/api/geometries') return json(200, { items: [GEOMETRY] });
    if (path === '/api/property-equations') return json(200, { items: [EQUATION] });
    if (path.startsWith('/api/property-equations/'))
      return json(200, { ...EQUATION, definition: idealGasDryAir, checks: [] });
    if (path === '/api/people')
      return json(200, {
        items: [
          { id: 'p-engineer', name: 'Edda Krantz', roles: ['engineer'] },
          { id: 'p-reviewer', name: 'Tomas Lindqvist', roles: ['reviewer'] },
        ],
      });
    if (path.endsWith('/submission')) {
      this.sheet = { ...this.sheet, standing: 'in review' };
      return json(201, this.sheet);
    }
    if (method === 'PUT' && ifMatch !== `"${this.sheet.hash}"`)
      return json(409, {
        type: 'urn:merestone:problem:stale',
        title: 'The content was changed in the meantime',
        detail: 'Load it again.',
      });
    if (definition) this.take(definition);
    if (slug !== undefined) this.sheet = { ...this.sheet, slug };
    return json(method === 'POST' ? 201 : 200, this.sheet);
  }
}

const GEOMETRY = {
  slug: 'wetted-wall',
  name: 'Wetted wall',
  summary: '',
  characteristicLength: 'Inside diameter, d',
  velocity: 'Relative to the wall',
  cautions: [],
  total: 1,
  approved: 1,
};
const EQUATION = {
  slug: 'ideal-gas-dry-air',
  title: 'Density of dry air, ideal gas',
  fluid: 'air',
  gives: 'gas-density',
  unit: 'kg/m^3',
  revision: 1,
  hash: 'a'.repeat(64),
  standing: 'approved',
};

/** The sample sheet as somebody's draft. */
export function draftSheet(over: Partial<Sheet> = {}): Sheet {
  const hash = '0'.repeat(64);
  return sampleSheet(undefined, {
    standing: 'draft',
    revision: 3,
    iteration: 1,
    hash,
    revisions: [{ number: 3, standing: 'draft', hash, at: '2026-03-05T09:00:00Z' }],
    approval: null,
    ...over,
  });
}

function json(status: number, body: object): Response {
  return new Response(JSON.stringify(body), {
    status,
    headers: { 'content-type': status < 400 ? 'application/json' : 'application/problem+json' },
  });
}
