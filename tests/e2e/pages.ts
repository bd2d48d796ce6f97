import type { APIRequestContext } from '@playwright/test';
import type { Person } from './people';

/** Every page and the person who meets it; null is nobody. A new page is added here. */
export interface Met {
  what: string;
  by: Person | null;
  /** Address, once ids are known. */
  address(ids: DemoIds): string;
}

export interface DemoIds {
  cistern: string;
  hull: string;
  draftOnly: string;
  grey: string;
}

export const pages: readonly Met[] = [
  { what: 'front page', by: null, address: () => '/' },
  { what: 'sign-in', by: null, address: () => '/sign-in' },
  { what: 'sign-up', by: null, address: () => '/sign-up' },
  { what: 'page of the API', by: null, address: () => '/api' },
  { what: 'page that is not there', by: null, address: () => '/no-such-page' },
  { what: 'home of the manager', by: 'manager', address: () => '/home' },
  { what: 'home of the designer', by: 'designer', address: () => '/home' },
  { what: 'home of the owner', by: 'owner', address: () => '/home' },
  { what: 'tank of the fitter', by: 'fitter', address: ({ hull }) => `/tanks/${hull}` },
  {
    what: 'tank with a draft only',
    by: 'designer',
    address: ({ draftOnly }) => `/tanks/${draftOnly}`,
  },
  { what: 'tank of the owner', by: 'owner', address: ({ cistern }) => `/tanks/${cistern}` },
  {
    what: 'card of drinking water',
    by: 'owner',
    address: ({ cistern }) => `/tanks/${cistern}/card`,
  },
  { what: 'card of grey water', by: 'fitter', address: ({ grey }) => `/tanks/${grey}/card` },
  { what: 'bench of the hull', by: 'designer', address: ({ hull }) => `/tanks/${hull}/bench` },
  {
    what: 'bench of a draft',
    by: 'manager',
    address: ({ draftOnly }) => `/tanks/${draftOnly}/bench`,
  },
];

/** Ids of the demo's tanks, asked of the API with the session of the page's context. */
export async function demoIds(request: APIRequestContext): Promise<DemoIds> {
  const tanks = (await (await request.get('/api/v1/tanks')).json()) as {
    id: string;
    name: string;
  }[];
  const id = (name: string) => {
    const tank = tanks.find((one) => one.name === name);
    if (!tank) throw new Error(`the demo has no tank "${name}"`);
    return tank.id;
  };
  return {
    cistern: id('Drinking water cistern'),
    hull: id('Port diesel tank'),
    draftOnly: id('Fresh water'),
    grey: id('Grey water'),
  };
}
