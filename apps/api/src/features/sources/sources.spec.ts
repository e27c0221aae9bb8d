import { sourcesAnswer } from '@chargewright/contract/sources';
import type { SourcesAnswer } from '@chargewright/contract/sources';
import { PROCEDURE_IDS } from '@chargewright/engine';
import { listSources } from '@chargewright/engine/sources';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestServer } from '../../testing/test-server';
import type { TestServer } from '../../testing/test-server';

let server: TestServer;
let body: unknown;
let answer: SourcesAnswer;
beforeAll(async () => {
  server = await startTestServer();
  body = await (await server.ask('/api/v1/sources')).json();
  answer = sourcesAnswer.parse(body);
});
afterAll(() => server.close());

const named = (id: string) => answer.entries.find((entry) => entry.id.startsWith(id));

describe('GET /api/v1/sources', () => {
  it('says nothing that the contract does not know', () => {
    expect(answer).toEqual(body);
  });

  it('lists everything that the engine does, and every set of rules', () => {
    expect(answer.entries.map(({ id }) => id)).toEqual(listSources().entries.map(({ id }) => id));
    expect(answer.procedures.map(({ id }) => id)).toEqual(PROCEDURE_IDS);
  });

  it('gives a figure with its print, its source, edition and standing', () => {
    expect(named('procedure-figure:superheat.toleranceK:cec-ra3.2-2008-rater')).toMatchObject({
      name: 'Superheat, ± of its target',
      figure: { value: expect.closeTo(10 / 3, 9) as number, unit: 'deltaC' },
      printed: '6 °F',
      standing: 'read',
      citations: [{ text: 'CEC Reference Residential Appendices (2008), RA3.2', edition: '2008' }],
      usedBy: { procedures: ['cec-ra3.2-2008-rater'], pages: ['check'] },
    });
    expect(named('figure:deepestVacuum')).toMatchObject({ figure: null, printed: '500 microns', text: null });
    expect(named('formula:subcooling')).toMatchObject({ text: 'T_bubble − T_liquid', figure: null, printed: null });
    expect(named('target:finer-table')).toMatchObject({ standing: 'memory', citations: [{ edition: null }] });
  });

  it('answers any origin, and is asked for again each time', async () => {
    const response = await server.ask('/api/v1/sources', { headers: { Origin: 'https://elsewhere.example' } });
    expect(response.headers.get('access-control-allow-origin')).toBe('*');
    expect(response.headers.get('access-control-allow-credentials')).toBeNull();
    expect(response.headers.get('cache-control')).toBe('no-cache');
    expect(response.headers.get('content-type')).toMatch(/^application\/json/);
  });

  it('only answers to be read', async () => {
    const response = await server.ask('/api/v1/sources', { method: 'POST' });
    expect(response.status).toBe(405);
    expect(response.headers.get('allow')).toBe('GET, HEAD, OPTIONS');
  });
});
