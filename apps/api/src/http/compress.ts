import compression from 'compression';

/** Brotli, gzip or nothing, as the client takes it; event streams are left alone, since a compressor would hold their events back. */
export const compress = compression({
  filter: (req, res) =>
    !String(res.getHeader('Content-Type')).startsWith('text/event-stream') && compression.filter(req, res),
});
