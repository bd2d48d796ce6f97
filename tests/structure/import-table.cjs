/*
 * Which room of src may import which other rooms; what is not listed is refused. Rooms that are
 * missing here (commands, the entry, compose, the middleware) tie everything together and may
 * import all.
 */
const rooms = {
  geometry: [],
  domain: ['geometry'],
  scene: ['domain', 'geometry'],
  workers: ['domain', 'geometry'],
  viewport: ['scene', 'domain', 'geometry'],
  islands: ['viewport', 'scene', 'workers', 'domain'],
  styles: [],
  components: ['domain', 'styles'],
  layouts: ['domain', 'components', 'styles'],
  'server/database': ['domain', 'server/config', 'server/log'],
  'server/jobs': ['domain', 'geometry', 'server/config', 'server/log'],
  'server/storage': ['domain', 'server/config', 'server/log'],
  'server/pdf': ['domain'],
  'server/auth': ['domain', 'server/config', 'server/database'],
  'server/services': [
    'domain',
    'geometry',
    'server/database',
    'server/auth',
    'server/pdf',
    'server/jobs',
    'server/context',
  ],
  'server/http': ['domain', 'server/log', 'server/context'],
  'server/openapi': ['domain', 'server/http'],
  'server/front': ['domain', 'server/config', 'server/log', 'server/context'],
  pages: [
    'server/http',
    'server/openapi',
    'server/services',
    'server/context',
    'domain',
    'layouts',
    'components',
    'islands',
  ],
};

module.exports = { rooms };
