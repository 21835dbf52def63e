const path = require('node:path')
const { getDefaultConfig } = require('expo/metro-config')

const config = getDefaultConfig(__dirname)

// Anchored to the project root: a loose /dist/ would also hide react-native-web/dist.
const root = __dirname.replace(/[\\^$.*+?()[\]{}|]/g, '\\$&')
const ours = ['\\.data', 'dist', 'tests', 'server', 'db', 'payments', 'seed', 'scripts']
config.resolver.blockList = [new RegExp(`^${root}/(${ours.join('|')})/.*`)]

// zod carries 60 language files that no screen uses; English is imported on its own.
const zodV4 = `${path.sep}zod${path.sep}v4${path.sep}`
config.resolver.resolveRequest = (context, name, platform) => {
  if (name === '../locales/index.js' && context.originModulePath.includes(zodV4)) return { type: 'empty' }
  return context.resolveRequest(context, name, platform)
}

module.exports = config
