import { evaluateUnitEndpoint } from '@shared/contracts/bench';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { type Route, serveAnyone } from '../http/serve';
import { demandPossible } from './demand-possible';

export const catalogueRoutes: Route[] = [
  serveAnyone(evaluateUnitEndpoint, (_actor, { body: { unit } }, { catalogue }) => {
    demandPossible([{ unit, pointer: '/unit' }], catalogue());
    return evaluateUnit(unit, catalogue());
  }),
];
