/** Keeps the site for use without a network: the worker is written after the build and fetches everything once. */
if (import.meta.env.PROD && 'serviceWorker' in navigator) {
  addEventListener('load', () => {
    // Refused in a private window or on plain http: the sheets work all the same, only not without a network.
    navigator.serviceWorker
      .register(new URL('service-worker.js', location.origin + import.meta.env.BASE_URL))
      .catch(() => undefined);
  });
}
