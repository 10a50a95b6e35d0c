import type { Check } from './check';
import { section } from './section/section';
import { stress } from './stress/stress';
import { waler } from './waler/waler';

/** Every check of the service; routes, batches and lists are made from it. */
export const checks: readonly Check[] = [waler, section, stress];
