/** jsdom has no IndexedDB, and Dexie looks for it when it is loaded: before any spec. */
import 'fake-indexeddb/auto';
