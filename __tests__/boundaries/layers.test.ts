import config from '../../.dependency-cruiser.cjs';

import { Tree, type Files } from './tree';

/** A tree of the project's shape that keeps every rule. */
const CLEAN: Files = {
  'app/(shop)/[wheelId].tsx': "export { Wheel as default } from '@/features/wheels/wheel-screen';",
  'app/index.tsx': "export { wheelQueries as default } from '@/features/wheels';",
  'assets/images.ts': 'export const images = [];',
  'features/ui/tokens.ts': 'export const tokens = { gap: 4 };',
  'features/transport/ask.ts': 'export const ask = (path: string) => path;',
  'features/wheels/index.ts': "export { wheelQueries } from './queries';",
  'features/wheels/queries.ts': `
    import { ask } from '@/features/transport/ask';
    import type { WheelAnswer } from '@/shared/contracts/wheels';
    export const wheelQueries = (answer: WheelAnswer) => [ask('wheels'), answer];`,
  'features/wheels/wheel-screen.tsx': `
    import { tokens } from '@/features/ui/tokens';
    export const Wheel = () => tokens.gap;`,
  'features/setups/index.ts': "export { setups } from './setups';",
  'features/setups/setups.ts': `
    import { wheelQueries } from '@/features/wheels';
    export const setups = wheelQueries;`,
  'shared/units/convert.ts': `
    import convert from 'convert-units';
    export const inch = () => convert(1).from('in').to('mm');`,
  'shared/domain/wheels.ts': 'export interface Wheel { diameterMm: number }',
  'shared/rules/speed.ts': `
    import type { Wheel } from '../domain/wheels';
    export const speed = (wheel: Wheel) => wheel.diameterMm;`,
  'shared/roles/roles.ts': 'export const can = () => true;',
  'shared/contracts/wheels.ts': `
    import * as z from 'zod';
    export const wheel = z.number();
    export type WheelAnswer = z.infer<typeof wheel>;`,
  'api/audit/trail.ts': 'export const record = () => undefined;',
  'api/http/errors.ts': 'export const status = 404;',
  'api/wheels/wheels-repository.ts': `
    import { client } from '@/db/client';
    export const find = () => client;`,
  'api/wheels/wheels-service.ts': `
    import { can } from '@/shared/roles/roles';
    import { record } from '../audit/trail';
    import { find } from './wheels-repository';
    export const service = () => [can(), record(), find()];`,
  'api/wheels/wheels-routes.ts': `
    import { Router } from 'express';
    import { wheel } from '@/shared/contracts/wheels';
    import { status } from '../http/errors';
    import { service } from './wheels-service';
    export const routes = () => [Router(), wheel, status, service()];`,
  'api/main.ts': "import { client } from '@/db/client'; export const main = client;",
  'api/start.mjs':
    "import fs from 'node:fs'; export { guard } from '../db/guard.mjs'; export { fs };",
  'db/guard.mjs': 'export const guard = 1;',
  'db/client.ts': "import { Pool } from 'pg'; export const client = Pool;",
  '__tests__/wheels.test.ts':
    "import { speed } from '@/shared/rules/speed'; speed({ diameterMm: 1 });",
};

const routes = (imports: string) => `
  import { wheel } from '@/shared/contracts/wheels';
  ${imports}
  export const routes = [wheel];`;

const service = (imports: string) => `
  import { can } from '@/shared/roles/roles';
  import { record } from '../audit/trail';
  ${imports}
  export const service = [can, record];`;

/** Under each rule's name, files that break it; the rule must name each of them. */
const PLANTED: Record<string, Files> = {
  'no-cycles': {
    'api/http/a.ts': "import { b } from './b'; export const a = () => b;",
    'api/http/b.ts': "import { a } from './a'; export const b = () => a;",
  },
  'no-feature-cycles': {
    'features/machines/index.ts': "export { machines } from './machines';",
    'features/machines/machines.ts':
      "import { surveys } from '@/features/surveys'; export const machines = () => surveys;",
    'features/surveys/index.ts': "export { surveys } from './surveys';",
    'features/surveys/surveys.ts':
      "import { machines } from '@/features/machines'; export const surveys = () => machines;",
  },
  unresolvable: { 'api/http/lost.ts': "import { gone } from './gone'; export const lost = gone;" },
  'shared-knows-nobody': {
    'shared/contracts/stored.ts': "export { client } from '@/db/client';",
    'shared/rules/drawn.ts': "export { tokens } from '../../features/ui/tokens';",
  },
  'shared-core-has-no-packages': {
    'shared/rules/parsed.ts': "import { z } from 'zod'; export const parsed = z;",
    'shared/rules/filed.ts': "import fs from 'node:fs'; export const filed = fs;",
  },
  'only-units-convert': {
    'shared/rules/inches.ts': "import convert from 'convert-units'; export const inches = convert;",
  },
  'shared-core-not-to-contracts': {
    'shared/domain/sent.ts':
      "import { wheel } from '../contracts/wheels'; export const sent = wheel;",
  },
  'contracts-only-zod': {
    'shared/contracts/hooks.ts': "import { useState } from 'react'; export const hooks = useState;",
  },
  'app-only-composes': {
    'app/rules.tsx': "export { speed as default } from '@/shared/rules/speed';",
  },
  'app-enters-by-screens': {
    'app/inside.tsx': "export { setups as default } from '@/features/setups/setups';",
  },
  'app-few-packages': {
    'app/query.tsx': "export { useQuery as default } from '@tanstack/react-query';",
  },
  'features-not-to-server-or-routes': {
    'features/wheels/database.ts': "export { client } from '@/db/client';",
    'features/wheels/typed.ts': "export type { service } from '@/api/wheels/wheels-service';",
    'features/wheels/cache.web.ts': "export { client } from '../../db/client';",
  },
  'features-by-the-door': {
    'features/setups/alias.ts': "export { Wheel } from '@/features/wheels/wheel-screen';",
    'features/setups/relative.ts': "export { wheelQueries } from '../wheels/queries';",
  },
  'platform-features-know-no-others': {
    'features/ui/badge.ts':
      "import { wheelQueries } from '@/features/wheels'; export const badge = wheelQueries;",
  },
  'ui-has-no-domain': {
    'features/ui/gauge.ts':
      "import { speed } from '@/shared/rules/speed'; export const gauge = speed;",
  },
  'browser-has-no-node': {
    'features/wheels/file.ts': "import fs from 'node:fs'; export const file = fs;",
  },
  'api-not-to-the-client': {
    'api/http/page.ts':
      "import { tokens } from '@/features/ui/tokens'; export const page = tokens;",
    'api/http/picture.ts':
      "import { images } from '@/assets/images'; export const picture = images;",
  },
  'only-repositories-touch-db': {
    'api/wheels/count-service.ts': service("import { client } from '@/db/client'; void client;"),
    'api/wheels/sort-service.ts': service("import { desc } from 'drizzle-orm'; void desc;"),
  },
  'services-know-no-http': {
    'api/wheels/label-service.ts': service(
      "import type { Request } from 'express'; export type R = Request;",
    ),
    'api/wheels/sum-service.ts': service("import { status } from '../http/errors'; void status;"),
  },
  'routes-not-to-repositories': {
    'api/wheels/fast-routes.ts': routes("import { find } from './wheels-repository'; void find;"),
  },
  'db-knows-nobody': {
    'db/plan.ts': "import { speed } from '@/shared/rules/speed'; export const plan = speed;",
    'db/answer.ts':
      "import { wheel } from '@/shared/contracts/wheels'; export const answer = wheel;",
  },
  'tests-stay-outside': {
    'api/http/helped.ts': "import '../../__tests__/wheels.test';",
  },
  'no-dev-dependencies': {
    'api/http/agent.ts': "import agent from 'supertest'; export const asked = agent;",
  },
  'launchers-need-nothing-installed': {
    'db/early.mjs': "import pg from 'pg'; export const early = pg;",
  },
  'routes-validate': { 'api/wheels/loose-routes.ts': 'export const routes = [];' },
  'services-check-roles': {
    'api/wheels/open-service.ts':
      "import { record } from '../audit/trail'; export const open = record;",
  },
  'services-leave-a-trail': {
    'api/wheels/silent-service.ts':
      "import { can } from '@/shared/roles/roles'; export const silent = can;",
  },
};

/** A cycle is named once, after one of its files or folders. */
const NAMED: Record<string, string[]> = {
  'no-cycles': ['api/http/a.ts'],
  'no-feature-cycles': ['features/machines', 'features/surveys'],
};

interface Answer {
  summary: { violations: { from: string; rule: { name: string } }[] };
}

function violations(files: Files) {
  const tree = new Tree(files);
  try {
    const args = ['--config', '.dependency-cruiser.cjs', '--output-type', 'json'];
    const answer = tree.run('depcruise', [...tree.folders(), ...args]) as Answer;
    return answer.summary.violations.map(({ from, rule }) => ({ from, rule: rule.name }));
  } finally {
    tree.remove();
  }
}

describe('the rules of who may import what', () => {
  const found = violations(Object.assign({}, CLEAN, ...Object.values(PLANTED)) as Files);

  test('pass on a tree that keeps them', () => {
    expect(violations(CLEAN)).toEqual([]);
  });

  test('are each broken below', () => {
    const rules = [...(config.forbidden ?? []), ...(config.required ?? [])].map(({ name }) => name);
    expect(Object.keys(PLANTED).sort()).toEqual(rules.sort());
  });

  test.each(Object.entries(PLANTED))('%s', (rule, files) => {
    const named = found.filter((violation) => violation.rule === rule).map(({ from }) => from);
    expect(named).toEqual(expect.arrayContaining(NAMED[rule] ?? Object.keys(files)));
  });
});
