/** Working without a network, updates and installing. */
export const offlineWords = {
  ready: 'Ready to work without a network',
  offline: 'No network',
  offlineNote: 'Everything on this page works without one.',
  updateAvailable: 'A newer version is ready',
  updateNow: 'Use it now',
  updateLater: 'Later',
  updateNote: 'What you typed stays.',
  updateBroken: 'The stored app is damaged. Load it again when there is a network; your checks stay on the phone.',
  reload: 'Load again',
  install: 'Install on this phone',
  installNote: 'Opens like an app, also without a network.',
};
