const { getDefaultConfig } = require('expo/metro-config');

const config = getDefaultConfig(__dirname);

// The subset of Source Sans 3 that ships with the application is woff2.
config.resolver.assetExts.push('woff2');

// Only the client is bundled: nothing of these folders may be watched or resolved from it.
config.resolver.blockList = [
  /[/\\]\.data(-test)?[/\\].*/,
  /[/\\]server[/\\](?!solvers).*/,
  /[/\\]tests[/\\].*/,
];

// Version 37 of victory-native draws with react-native-svg; on the web its twin draws with the DOM.
const resolveRequest = config.resolver.resolveRequest;
config.resolver.resolveRequest = (context, name, platform) => {
  const target = platform === 'web' && name === 'victory-native' ? 'victory' : name;
  return (resolveRequest ?? context.resolveRequest)(context, target, platform);
};

// In development the bundler serves the client and hands the API to the Express server.
const apiPort = process.env.SPATE_API_PORT;
if (apiPort) {
  const http = require('node:http');
  config.server.enhanceMiddleware = (middleware) => (req, res, next) => {
    if (!req.url.startsWith('/api/')) return middleware(req, res, next);
    const proxied = http.request(
      {
        host: '127.0.0.1',
        port: apiPort,
        path: req.url,
        method: req.method,
        headers: req.headers,
      },
      (answer) => {
        res.writeHead(answer.statusCode, answer.headers);
        answer.pipe(res);
      },
    );
    proxied.on('error', () => {
      res.statusCode = 502;
      res.end();
    });
    req.pipe(proxied);
  };
}

module.exports = config;
