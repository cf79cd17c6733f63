import { AsyncLocalStorage } from 'node:async_hooks';
import { Injectable } from '@nestjs/common';

/** The one source of the time. */
@Injectable()
export class Clock {
  private readonly moment = new AsyncLocalStorage<Date>();

  now(): Date {
    return this.moment.getStore() ?? this.current();
  }

  /** Does work as if it were done at another moment: the demo writes its history so. */
  asOf<T>(moment: Date, work: () => T): T {
    return this.moment.run(moment, work);
  }

  protected current(): Date {
    return new Date();
  }
}
