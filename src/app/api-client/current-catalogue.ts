import { inject, Injectable, signal } from '@angular/core';
import { readCatalogue } from '@shared/contracts/bench';
import { ApiClient } from './api-client';
import { loaded } from './loaded';

/** The catalogue, read once and kept as long as the page lives. */
@Injectable({ providedIn: 'root' })
export class CurrentCatalogue {
  private readonly api = inject(ApiClient);
  private readonly read = loaded(signal(true), () => this.api.call(readCatalogue));
  readonly catalogue = this.read.value;
  readonly problem = this.read.problem;
  readonly reload = () => this.read.reload();
}
