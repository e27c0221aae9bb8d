/**
 * The page's service worker: Angular's, which keeps the app and answers without a network, and room for what it does not do (Background
 * Sync has to be handled in the worker itself). Imported first, so that its handlers answer first.
 */
importScripts('./ngsw-worker.js');
