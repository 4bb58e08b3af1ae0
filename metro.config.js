// Learn more: https://docs.expo.dev/guides/customizing-metro
const { getDefaultConfig } = require('expo/metro-config');
const { createProxyMiddleware } = require('http-proxy-middleware');

/** @type {import('expo/metro-config').MetroConfig} */
const config = getDefaultConfig(__dirname);

// Web fonts are a tenth of the size of the same fonts as .ttf.
config.resolver.assetExts.push('woff2');

// The database's files change all the time and are none of Metro's business.
config.resolver.blockList = [
  ...[config.resolver.blockList].flat(),
  /(?:^|[\\/])\.local(?:[\\/]|$)/,
];

// In development the page comes from Metro and /api from Express, on one origin, as in production.
const api = createProxyMiddleware({
  target: process.env.API_URL ?? 'http://127.0.0.1:3000',
  pathFilter: '/api',
});
config.server.enhanceMiddleware = (middleware) => (req, res, next) =>
  api(req, res, (error) => (error ? next(error) : middleware(req, res, next)));

module.exports = config;
