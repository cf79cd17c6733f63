import type { StudyRole } from '../contract/studies.js';

/** One password for all of the demo's people, shown beside their names. */
export const demoPassword = 'steelyard-demo';

export interface DemoPerson {
  name: string;
  email: string;
  part: string;
  administrator: boolean;
}

export const demoPeople = {
  arrivel: member('Tomas Arrivel', 'tomas.arrivel@brackwater.example', 'methodologist', 'Stillfoot'),
  quennell: member('Ilse Quennell', 'ilse.quennell@brackwater.example', 'investigator', 'Stillfoot'),
  venn: member('Priya Venn', 'priya.venn@hollin-fund.example', 'funder', 'Stillfoot'),
  brannick: member('Lotte Brannick', 'lotte.brannick@brackwater.example', 'reader', 'Stillfoot'),
  oyelaran: member('Jun Oyelaran', 'jun.oyelaran@fernhollow.example', 'methodologist', 'Greenkettle'),
  doss: member('Amara Doss', 'amara.doss@fernhollow.example', 'investigator', 'Greenkettle'),
  solt: member('Marek Solt', 'marek.solt@lantern-basin.example', 'funder', 'Greenkettle'),
  tarvin: member('Noemi Tarvin', 'noemi.tarvin@fernhollow.example', 'reader', 'Greenkettle'),
  aalderink: member(
    'Renske Aalderink',
    'renske.aalderink@bristlecone.example',
    'methodologist',
    'Nimblegrip',
  ),
  mackrell: member('Oona Mackrell', 'oona.mackrell@bristlecone.example', 'investigator', 'Nimblegrip'),
  hallam: member('Dev Hallam', 'dev.hallam@sallow-street.example', 'funder', 'Nimblegrip'),
  ferrow: member('Kit Ferrow', 'kit.ferrow@bristlecone.example', 'reader', 'Nimblegrip'),
  wexley: {
    name: 'Sable Wexley',
    email: 'sable.wexley@steelyard.example',
    part: 'Administrator',
    administrator: true,
  },
} satisfies Record<string, DemoPerson>;

export type DemoPersonKey = keyof typeof demoPeople;

function member(name: string, email: string, role: StudyRole, study: string): DemoPerson {
  return {
    name,
    email,
    part: `${role.charAt(0).toUpperCase()}${role.slice(1)}, ${study}`,
    administrator: false,
  };
}
