import { readHealth, readSite } from '../services/site.service';
import { Reply, route } from './route';

export const siteRoutes = [
  route('get', '/health', {
    access: 'open',
    handle: async ({ ctx }) => {
      const health = await readHealth(ctx);
      return new Reply(health.status === 'ok' ? 200 : 503, health);
    },
  }),
  route('get', '/site', { access: 'open', handle: ({ ctx }) => readSite(ctx) }),
];
