/**
 * A wish to stop: Ctrl-C, SIGTERM, or the terminal closing. The first one counts; later ones (npm passes on what the
 * terminal has already sent) change nothing, since stopping is under way.
 */
export function stopWish() {
  const controller = new AbortController();
  let wish = () => {};
  const came = new Promise((resolve) => {
    wish = resolve;
  });
  for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(name, () => {
      wish(name);
      controller.abort();
    });
  }
  return { came, signal: controller.signal };
}
