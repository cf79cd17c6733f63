import { setTimeout as wait } from 'node:timers/promises';
import type { LedgerView, PlanningValueView, StudyView } from '../../src/contract/studies.js';
import { ServerProcess } from './server-process.js';

const keys = ['sd', 'attrition', 'icc', 'clusterSizeCv'];

const study = {
  name: 'Newfield',
  organisation: 'Merrow Institute',
  question: 'Does it help?',
  outcome: { kind: 'continuous', label: 'Pain', unit: 'points', difference: 1 },
  sd: 2,
  participants: { one: 'participant', many: 'participants' },
  clusters: { one: 'village', many: 'villages' },
  treatments: [{ name: 'Usual care' }, { name: 'Something else' }],
  randomises: 'clusters',
};

interface Written {
  id: string;
  version: number;
  value: number;
}

/** Four who set planning values of one study all the time, on a server that is killed while they do. */
export class Writers {
  /** Every write that the server said it had stored. */
  readonly acknowledged: Written[] = [];

  private constructor(
    private readonly folder: string,
    private server: ServerProcess,
    private readonly cookie: string,
    private readonly studyId: string,
  ) {}

  static async start(folder: string): Promise<Writers> {
    const server = await ServerProcess.start(folder);
    const [, code] = await server.said(/\/welcome\/(\S+)/);
    const person = { name: 'Ada Merrow', email: 'ada@merrow.example', password: 'a kitchen garden' };
    const entered = await server.ask('POST', '/first-visit', undefined, { code, ...person });
    const cookie = entered?.cookie ?? '';
    const started = await server.ask('POST', '/studies', cookie, study);
    expect([entered?.status, started?.status]).toEqual([201, 201]);
    return new Writers(folder, server, cookie, (started?.body as StudyView | undefined)?.id ?? '');
  }

  /** Writes until the server is killed, and looks for what it had acknowledged once it is back. */
  async round(): Promise<void> {
    const { values } = (await this.read('/planning-values')) as LedgerView;
    const lines = values.filter(({ key }) => keys.includes(key));
    expect(lines).toHaveLength(keys.length);
    const before = this.acknowledged.length;
    let stopped = false;
    const writing = Promise.allSettled(lines.map((line) => this.write(line))).finally(() => {
      stopped = true;
    });
    while (!stopped && this.acknowledged.length < before + keys.length) await wait(1);
    await wait(Math.random() * 60);
    await this.server.kill();
    expect((await writing).filter(({ status }) => status === 'rejected')).toEqual([]);
    this.server = await ServerProcess.start(this.folder);
    await this.expectAll(this.acknowledged.slice(before));
  }

  async expectAll(acknowledged: Written[]): Promise<void> {
    for (const id of new Set(acknowledged.map((written) => written.id))) {
      const { entries } = (await this.read(`/planning-values/${id}/history`)) as { entries: Written[] };
      const stored = new Map(entries.map(({ version, value }) => [version, value]));
      for (const { version, value } of acknowledged.filter((written) => written.id === id)) {
        expect([version, stored.get(version)]).toEqual([version, value]);
      }
    }
  }

  stop(): Promise<void> {
    return this.server.kill();
  }

  private async read(room: string): Promise<unknown> {
    return (await this.server.ask('GET', `/studies/${this.studyId}${room}`, this.cookie))?.body;
  }

  private async write({ id, setBy: _, setAt: __, ...line }: PlanningValueView): Promise<void> {
    const { server } = this;
    for (let { version } = line; ; version += 1) {
      // A figure as people state one: SQLite may read the seventeenth digit back as its neighbour.
      const body = { ...line, version, value: Number((0.1 + Math.random() / 2).toPrecision(12)) };
      const response = await server.ask('PUT', `/studies/${this.studyId}/planning-values`, this.cookie, body);
      if (!response) return;
      expect(response.status).toBe(200);
      this.acknowledged.push({ id, value: body.value, version: version + 1 });
    }
  }
}
