import { inject } from '@angular/core';
import { type CanMatchFn, Router } from '@angular/router';
import { type EndpointId } from '@shared/contracts/endpoints';
import { Session } from './session';

/** Lets those in who may call the endpoint; sends visitors to sign in first, and others to "nothing here". */
export function mayUse(endpointId: EndpointId): CanMatchFn {
  return (_route, segments) => {
    const session = inject(Session);
    if (session.may(endpointId)) return true;
    if (session.user()) return false;
    const navigation = inject(Router).currentNavigation();
    const wanted = navigation?.extractedUrl.toString() ?? `/${segments.map(({ path }) => path).join('/')}`;
    return inject(Router).createUrlTree(['/sign-in'], { queryParams: { then: wanted } });
  };
}
