import type { ServerResponse } from 'node:http';
import { sep } from 'node:path';
import type { ConfigType } from '@nestjs/config';
import { ServeStaticModule } from '@nestjs/serve-static';
import { settings } from '../config/settings';

/** The built web application on the same port: every page address that is no file gets its one page. */
export const WebAppModule = ServeStaticModule.forRootAsync({
  inject: [settings.KEY],
  useFactory: ({ webDist }: ConfigType<typeof settings>) =>
    webDist
      ? [
          {
            rootPath: webDist,
            exclude: ['/api', '/api/{*path}', '/assets/{*path}'],
            serveStaticOptions: { index: false, setHeaders: setCaching },
          },
        ]
      : [],
});

function setCaching(response: ServerResponse, path: string): void {
  const hashed = path.includes(`${sep}assets${sep}`);
  response.setHeader('Cache-Control', hashed ? 'public, max-age=31536000, immutable' : 'no-cache');
}
