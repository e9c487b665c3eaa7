const http = require('node:http');
const path = require('node:path');
const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);

const here = (file) => ({ type: 'sourceFile', filePath: path.join(__dirname, file) });
const nothing = { type: 'empty' };

// What the first load leaves out, by who asks and for what: all of zod's languages but one and its JSON Schema (the
// server's); navigators and link previews of the router (the app has one Slot, and links of its own); drawings read
// from text; animated lists and old touchables (the app has none). Whoever needs one of them takes its line out and
// looks at the size of the first load.
const leftOut = [
  [/^zod\//, /(^|\/)locales(\/index\.c?js)?$/, here('components/data/zod-locales.ts')],
  [
    /^zod\//,
    /\/(compile|from-json-schema|to-json-schema|json-schema-generator|json-schema-processors)\.js$/,
    nothing,
  ],
  [/^expo-router\/build\//, /\/layouts\/StackClient$/, here('components/shell/slot-router.ts')],
  [/^expo-router\/build\//, /^\.\/(stack|color|layouts\/(Tabs|experimental-stack))$/, nothing],
  [/^expo-router\/build\//, /(^|\/)(react-navigation\/(bottom-tabs|elements)|native-tabs(\/\w+)?)$/, nothing],
  [/^expo-router\/build\/ExpoRoot/, /^\.\/screensFeatureFlags$/, here('components/shell/slot-router.ts')],
  [/^expo-router\/build\/link\//, /^\.\/(elements|LinkWithPreview)$/, nothing],
  [/^react-native-svg\//, /^\.\/(xml|deprecated|utils\/fetchData|transform|transformToRn)$/, nothing],
  [
    /^(react-native-web|expo|expo-router|react-native-screens)\//,
    /(exports|\.\.)\/(Animated|FlatList|SectionList|VirtualizedList|Touchable\w+|LayoutAnimation|Modal|RefreshControl|CheckBox|ProgressBar)$/,
    nothing,
  ],
];

const resolveAsUsual = config.resolver.resolveRequest;
config.resolver.resolveRequest = (context, name, platform) => {
  const asker = context.originModulePath.replaceAll('\\', '/').split('/node_modules/').pop() ?? '';
  const found = leftOut.find(([who, what]) => who.test(asker) && what.test(name));
  return found ? found[2] : (resolveAsUsual ?? context.resolveRequest)(context, name, platform);
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
