/** One import that breaks a rule. */
export interface Forbidden {
  readonly rule: string;
  readonly from: string;
  readonly to: string;
}

const breaks = (rule: string, from: string, ...targets: string[]): Forbidden[] =>
  targets.map((to) => ({ rule, from, to }));

const mayImport = (from: string, ...targets: string[]): Omit<Forbidden, 'rule'>[] =>
  targets.map((to) => ({ from, to }));

export const forbidden: readonly Forbidden[] = [
  ...breaks('no-circles', 'server/print/circle-a.ts', 'server/print/circle-b.ts'),
  ...breaks('nothing-missing', 'src/lib/lost.ts', 'src/lib/not-there.ts'),
  ...breaks('no-development-packages-in-the-product', 'server/http/dev.ts', 'vitest'),
  ...breaks('product-never-imports-tests', 'src/lib/tested.ts', 'tests/support/help.ts'),

  ...breaks(
    'sky-stands-alone',
    'shared/sky/time/day.ts',
    'shared/kernel/text.ts',
    'zod',
    'shared/contracts/place.ts',
  ),
  ...breaks('sky-upward-units', 'shared/sky/units/angle.ts', 'shared/sky/time/day.ts'),
  ...breaks('sky-upward-time', 'shared/sky/time/day.ts', 'shared/sky/stars/star.ts'),
  ...breaks('sky-upward-stars', 'shared/sky/stars/star.ts', 'shared/sky/sun/sun.ts'),
  ...breaks('sky-upward-sun', 'shared/sky/sun/sun.ts', 'shared/sky/horizon/line.ts'),
  ...breaks('sky-upward-horizon', 'shared/sky/horizon/line.ts', 'shared/sky/phenomena/rise.ts'),
  ...breaks('sky-upward-phenomena', 'shared/sky/phenomena/rise.ts', 'shared/sky/visibility/see.ts'),
  ...breaks('sky-upward-visibility', 'shared/sky/visibility/see.ts', 'shared/sky/markers/marker.ts'),
  ...breaks('sky-upward-markers', 'shared/sky/markers/marker.ts', 'shared/sky/look/look.ts'),
  ...breaks('sky-upward-look', 'shared/sky/look/look.ts', 'shared/sky/moon/month.ts'),
  ...breaks('sky-upward-moon', 'shared/sky/moon/month.ts', 'shared/sky/planets/venus.ts'),
  ...breaks('sky-upward-planets', 'shared/sky/planets/venus.ts', 'shared/sky/sky-markers/noon.ts'),
  ...breaks('sky-layers-below-the-door', 'shared/sky/markers/marker.ts', 'shared/sky/index.ts'),
  ...breaks('sky-through-its-door', 'server/features/stars/stars.service.ts', 'shared/sky/stars/star.ts'),
  ...breaks('sky-through-its-door', 'src/features/stars/strip.tsx', 'shared/sky/time/day.ts'),

  ...breaks('calendar-rules-are-pure', 'shared/calendar/window.ts', 'shared/contracts/place.ts', 'zod'),
  ...breaks(
    'contracts-know-constants-only',
    'shared/contracts/place.ts',
    'shared/sky/index.ts',
    'shared/calendar/window.ts',
  ),
  ...breaks('sheet-is-geometry', 'shared/sheet/ring.ts', 'shared/contracts/place.ts', 'shared/sky/index.ts'),
  ...breaks('kernel-imports-nothing', 'shared/kernel/text.ts', 'shared/locales/en.ts', 'zod'),
  ...breaks('locales-are-texts', 'shared/locales/en.ts', 'shared/calendar/window.ts'),
  ...breaks('shared-without-node', 'shared/kernel/files.ts', 'node:fs'),

  ...breaks(
    'server-base-below-features',
    'server/http/reply.ts',
    'server/features/places/places.service.ts',
    'server/app.ts',
  ),
  ...breaks('server-upward-config', 'server/config/env.ts', 'server/db/data-source.ts'),
  ...breaks('server-upward-db', 'server/db/data-source.ts', 'server/policy/policy.ts'),
  ...breaks('server-upward-policy', 'server/policy/policy.ts', 'server/storage/disk.ts'),
  ...breaks('server-upward-storage', 'server/storage/disk.ts', 'server/media/sound.ts'),
  ...breaks('server-upward-media', 'server/media/sound.ts', 'server/mail/smtp.ts'),
  ...breaks('server-upward-mail', 'server/mail/smtp.ts', 'server/print/pdf.ts'),
  ...breaks('server-upward-print', 'server/print/pdf.ts', 'server/http/reply.ts'),
  ...breaks(
    'features-meet-through-services',
    'server/features/sheets/sheets.service.ts',
    'server/features/places/places.mapper.ts',
  ),
  ...breaks(
    'features-meet-through-services',
    'server/features/sheets/sheets.routes.ts',
    'server/features/places/places.routes.ts',
  ),
  ...breaks('features-below-the-app', 'server/features/places/places.routes.ts', 'server/app.ts'),
  ...breaks(
    'routes-without-database',
    'server/features/places/places.routes.ts',
    'typeorm',
    'server/db/entities/place.entity.ts',
  ),
  ...breaks(
    'services-without-express',
    'server/features/places/places.service.ts',
    'express',
    'server/http/reply.ts',
  ),
  ...breaks('services-without-express', 'server/features/places/places.mapper.ts', 'express'),
  ...breaks(
    'workers-know-shared-only',
    'server/workers/sky.worker.ts',
    'server/http/reply.ts',
    'server/features/places/places.service.ts',
  ),
  ...breaks('server-never-imports-screens', 'server/print/pdf.ts', 'src/ui/button.tsx'),
  ...breaks('server-never-imports-screens', 'shared/sheet/ring.ts', 'src/ui/button.tsx'),

  ...breaks(
    'screens-never-import-server',
    'src/features/places/form.tsx',
    'server/db/entities/place.entity.ts',
  ),
  ...breaks('screens-never-import-server', 'src/app/router.tsx', 'server/config/env.ts'),
  ...breaks('screens-without-node', 'src/lib/files.ts', 'node:path'),
  ...breaks('kit-below-features', 'src/ui/button.tsx', 'src/features/places/form.tsx'),
  ...breaks('kit-below-features', 'src/lib/paths.ts', 'src/app/router.tsx'),
  ...breaks(
    'screen-features-apart',
    'src/features/places/form.tsx',
    'src/features/stars/strip.tsx',
    'src/app/router.tsx',
  ),
];

export const allowed: readonly Omit<Forbidden, 'rule'>[] = [
  // The second half of the circle above; it is reported once.
  ...mayImport('server/print/circle-b.ts', 'server/print/circle-a.ts'),
  ...mayImport(
    'shared/sky/markers/pair.ts',
    'shared/sky/units/angle.ts',
    'shared/sky/vocabulary.ts',
    'astronomy-engine',
  ),
  ...mayImport('shared/sky/index.ts', 'shared/sky/markers/pair.ts'),
  ...mayImport('shared/calendar/clash.ts', 'shared/sky/index.ts', 'shared/kernel/text.ts'),
  ...mayImport('shared/contracts/star.ts', 'zod', 'shared/sky/vocabulary.ts', 'shared/kernel/list.ts'),
  ...mayImport('shared/sheet/box.ts', 'shared/calendar/clash.ts', 'shared/kernel/list.ts'),
  ...mayImport(
    'server/http/session.ts',
    'express',
    'server/db/entities/place.entity.ts',
    'server/config/env.ts',
    'shared/contracts/star.ts',
  ),
  ...mayImport('server/db/entities/a.entity.ts', 'server/db/entities/b.entity.ts', 'typeorm'),
  ...mayImport('server/db/entities/b.entity.ts', 'server/db/entities/a.entity.ts'),
  ...mayImport(
    'server/features/reviews/reviews.routes.ts',
    'server/features/reviews/reviews.service.ts',
    'express',
    'server/http/session.ts',
  ),
  ...mayImport(
    'server/features/reviews/reviews.service.ts',
    'server/features/calendars/calendars.service.ts',
    'server/db/entities/a.entity.ts',
    'server/http/app-error.ts',
    'shared/calendar/clash.ts',
    'typeorm',
  ),
  ...mayImport('server/workers/year.worker.ts', 'shared/sky/index.ts', 'node:worker_threads'),
  ...mayImport('server/main.ts', 'server/wiring.ts', 'server/db/entities/a.entity.ts'),
  ...mayImport(
    'src/features/reviews/card.tsx',
    'src/ui/field.tsx',
    'src/lib/days.ts',
    'shared/contracts/star.ts',
    'react',
  ),
  ...mayImport('src/app/page.tsx', 'src/features/reviews/card.tsx', 'src/ui/field.tsx'),
];
