/**
 * Where an example is opened to be worked by hand. A check goes to Check a charge through its store; the others go to a page of their own, by its
 * address, if this version has one.
 *
 * Properties: `?dryBulb=100&wetBulb=65&pressure=14.696&units=F-psi` (°F, psia). Weigh in: `?example=printed-sum`.
 */
import type { Params, Routes } from '@angular/router';
import type { WorkedExample } from '@chargewright/engine/training';

export interface OtherPage {
  readonly path: '/properties' | '/weigh-in';
  readonly query: Params;
}

const hasPage = (routes: Routes, path: string): boolean => routes.some((route) => route.path === path);

export function otherPageOf(example: WorkedExample, routes: Routes): OtherPage | undefined {
  switch (example.kind) {
    case 'check':
      return undefined;
    case 'moist-air': {
      const { dryBulbF, wetBulbF, pressurePsia } = example.given;
      const query = { dryBulb: dryBulbF, wetBulb: wetBulbF, pressure: pressurePsia, units: 'F-psi' };
      return hasPage(routes, 'properties') ? { path: '/properties', query } : undefined;
    }
    case 'weigh-in':
      return hasPage(routes, 'weigh-in') ? { path: '/weigh-in', query: { example: example.id } } : undefined;
  }
}
