import { weatherEndpoints } from '#shared/contracts/weather.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { WeatherService } from './weather.service.js';

export function weatherRoutes(mount: Mount, weather: WeatherService): void {
  mount.forMember(weatherEndpoints.read, (_call, actor) => weather.read(actor));
  mount.forMember(weatherEndpoints.listNotices, async (_call, actor) =>
    wholeList(await weather.allNotices(actor)),
  );
  mount.forMember(weatherEndpoints.addNotice, ({ body }, actor) => weather.addNotice(actor, body));
  mount.forMember(weatherEndpoints.removeNotice, async ({ params }, actor) => {
    await weather.removeNotice(actor, params.noticeId);
    return undefined;
  });
  mount.forMember(weatherEndpoints.addRain, ({ body }, actor) => weather.addRain(actor, body));
  mount.forMember(weatherEndpoints.removeRain, async ({ params }, actor) => {
    await weather.removeRain(actor, params.rainId);
    return undefined;
  });
}
