import { Query } from '@nestjs/cqrs';
import type { PeopleView } from '../../contract/people.js';

export class WhichPeople extends Query<PeopleView> {}
