import type { Problem } from '@steelyard/api/contract/problem';
import { HttpResponse, http } from 'msw';
import { setupServer } from 'msw/node';
import type { StudyFixture } from './fixtures/study-fixture';

export const server = setupServer();

export const person = {
  id: '11111111-1111-4111-8111-111111111111',
  name: 'Tomas Arrivel',
  email: 'tomas.arrivel@brackwater.example',
  administrator: false,
};

export const answer = {
  access: (demo: unknown = null, firstVisit = false) =>
    http.get('*/api/access', () => HttpResponse.json({ firstVisit, demo })),
  session: (who: object | null = person) =>
    http.get('*/api/session', () => (who ? HttpResponse.json(who) : problem(401, 'signed-out'))),
  studies: (...studies: object[]) => http.get('*/api/studies', () => HttpResponse.json({ studies })),
};

export function problem(status: number, code: Problem['code'], more: Partial<Problem> = {}) {
  return HttpResponse.json(
    { type: 'about:blank', title: code, status, code, ...more },
    { status, headers: { 'content-type': 'application/problem+json' } },
  );
}

/** Someone is signed in and the study is there, in its five parts. */
export function serve({ study, ledger, costs, designSet, limits }: StudyFixture): void {
  server.use(
    answer.session(),
    http.get(`*/api/studies/${study.id}`, () => HttpResponse.json(study)),
    http.get(`*/api/studies/${study.id}/planning-values`, () => HttpResponse.json({ values: ledger })),
    http.get(`*/api/studies/${study.id}/costs`, () => HttpResponse.json(costs)),
    http.get(`*/api/studies/${study.id}/limits`, () => HttpResponse.json(limits)),
    http.get(`*/api/studies/${study.id}/design-set`, () => HttpResponse.json(designSet)),
  );
}
