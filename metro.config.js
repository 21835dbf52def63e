const path = require('node:path')
const { getDefaultConfig } = require('expo/metro-config')

const config = getDefaultConfig(__dirname)

// Anchored to the project root: a loose /dist/ would also hide react-native-web/dist.
const root = __dirname.replace(/[\\^$.*+?()[\]{}|]/g, '\\$&')
const ours = ['\\.data', 'dist', 'tests', 'server', 'db', 'payments', 'seed', 'scripts']
config.resolver.blockList = [new RegExp(`^${root}/(${ours.join('|')})/.*`)]

// zod carries 60 language files that no screen uses; English is imported on its own.
const zodV4 = `${path.sep}zod${path.sep}v4${path.sep}`
const isLanguageOfZod = (context, name) =>
  name === '../locales/index.js' && context.originModulePath.includes(zodV4)

// What no screen asks of zod: schemas printed as JSON Schema and read from it (the API's description does, on the
// server), schemas made into code (the pages' policy forbids it), schemas rewritten part by part.
const unasked =
  /\/(json-schema-processors|json-schema-generator|to-json-schema|from-json-schema|compile|visit|deep-partial|in-out)\.js$/
const isUnaskedOfZod = (context, name) => unasked.test(name) && context.originModulePath.includes(zodV4)

// What the first load would carry on the web although no screen draws it: controls that have better twins in
// components/ui, the colour arithmetic of a header we hide, the router's own list of routes.
const undrawn =
  /^\.\/exports\/(CheckBox|Clipboard|ImageBackground|InputAccessoryView|KeyboardAvoidingView|Picker|ProgressBar|SectionList|Share|TouchableHighlight|TouchableNativeFeedback|TouchableOpacity|Vibration|YellowBox)$/
const webRoot = path.join('react-native-web', 'dist', 'index.js')
const routerViews = path.join('expo-router', 'build')
const isUndrawn = (context, name) =>
  (undrawn.test(name) && context.originModulePath.endsWith(webRoot)) ||
  (/^(color|\.{1,2}\/(views\/)?Sitemap)$/.test(name) && context.originModulePath.includes(routerViews))

config.resolver.resolveRequest = (context, name, platform) =>
  isLanguageOfZod(context, name) ||
  isUnaskedOfZod(context, name) ||
  (platform === 'web' && isUndrawn(context, name))
    ? { type: 'empty' }
    : context.resolveRequest(context, name, platform)

module.exports = config
