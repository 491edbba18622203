import { isPlatformBrowser } from '@angular/common';
import { computed, DOCUMENT, inject, Injectable, PLATFORM_ID, signal } from '@angular/core';
import { firstValueFrom } from 'rxjs';
import { type EndpointId } from '@shared/contracts/endpoints';
import { type User } from '@shared/contracts/session';
import { mayCall } from '@shared/contracts/who-may-call';
import { ApiClient } from '../api-client/api-client';
import { ProblemError } from '../api-client/problem-error';

/** The schemas come when they are needed: most visitors read pages and never sign in. */
const contracts = () => import('@shared/contracts/session');

/** Who is signed in. On the server nobody is: public pages are rendered for visitors. */
@Injectable({ providedIn: 'root' })
export class Session {
  private readonly api = inject(ApiClient);
  private readonly document = inject(DOCUMENT);
  private readonly inBrowser = isPlatformBrowser(inject(PLATFORM_ID));
  private readonly found = signal<User | null | undefined>(undefined);

  readonly user = computed(() => this.found() ?? null);
  /** whether it is known yet if somebody is signed in */
  readonly known = computed(() => this.found() !== undefined);

  /** Asks the server who we are, where a cookie says that there may be somebody. */
  async start(): Promise<void> {
    if (!this.inBrowser || !this.document.cookie.includes('XSRF-TOKEN=')) {
      this.found.set(null);
      return;
    }
    try {
      const { me } = await contracts();
      this.found.set((await firstValueFrom(this.api.call(me))).user);
    } catch (error) {
      this.found.set(null);
      if (!(error instanceof ProblemError && error.status === 401)) console.error(error);
    }
  }

  /** @throws ProblemError `wrong-credentials` or `too-many` */
  async signIn(email: string, password: string): Promise<User> {
    const { signIn } = await contracts();
    const { user } = await firstValueFrom(this.api.call(signIn, { body: { email, password } }));
    this.found.set(user);
    return user;
  }

  async signOut(): Promise<void> {
    const { signOut } = await contracts();
    await firstValueFrom(this.api.call(signOut));
    this.found.set(null);
  }

  /** The server said that the session ended. */
  ended(): void {
    this.found.set(null);
  }

  may(endpointId: EndpointId): boolean {
    return mayCall(endpointId, this.user()?.roles ?? []);
  }
}
