const http = require('node:http');
const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);

// The bundle takes one of zod's languages instead of all of them.
const resolveAsUsual = config.resolver.resolveRequest;
config.resolver.resolveRequest = (context, name, platform) => {
  const fromZod = /[\\/]node_modules[\\/]zod[\\/]/.test(context.originModulePath);
  if (fromZod && /(^|\/)locales(\/index\.c?js)?$/.test(name)) {
    return { type: 'sourceFile', filePath: path.join(__dirname, 'components/data/zod-locales.ts') };
  }
  return (resolveAsUsual ?? context.resolveRequest)(context, name, platform);
};

// Server-side folders never belong to the bundle, and their churn should not wake the watcher.
config.resolver.blockList = [
  ...[config.resolver.blockList ?? []].flat(),
  new RegExp(`^${path.join(__dirname, '.local').replace(/[/.\\]/g, '\\$&')}[\\\\/].*`),
];

/** In development the bundler hands API calls and fonts on to the server, so that the browser sees one origin. */
function handOn(request, response) {
  const onward = http.request(
    {
      host: '127.0.0.1',
      port: process.env.API_PORT,
      path: request.url,
      method: request.method,
      headers: request.headers,
    },
    (answer) => {
      response.writeHead(answer.statusCode ?? 502, answer.headers);
      answer.pipe(response);
    },
  );
  onward.on('error', () => {
    response.writeHead(503, { 'content-type': 'text/plain' });
    response.end('The server is not up yet.');
  });
  request.pipe(onward);
}

config.server = {
  ...config.server,
  enhanceMiddleware: (middleware) => (request, response, next) =>
    process.env.API_PORT && /^\/(api|fonts)\//.test(request.url ?? '')
      ? handOn(request, response)
      : middleware(request, response, next),
};

module.exports = config;
