import { Query } from '@nestjs/cqrs';
import type { AccessView } from '../../contract/access.js';

export class HowToEnter extends Query<AccessView> {}
