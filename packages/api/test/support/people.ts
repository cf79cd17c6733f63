import { demoPassword, demoPeople } from '../../src/demo/people.js';
import { CreatePerson } from '../../src/people/commands/create-person.command.js';
import type { TestApp } from './test-app.js';

export const email = (key: keyof typeof demoPeople) => demoPeople[key].email;

/** Somebody who has an account and no part in anything. */
export async function addPerson(app: TestApp, address: string, administrator = false): Promise<string> {
  return app.commands.execute(
    new CreatePerson({ name: 'Ada Merrow', email: address, password: demoPassword, administrator }),
  );
}
