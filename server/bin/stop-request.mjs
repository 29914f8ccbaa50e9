const controller = new AbortController();

/** Raised once when somebody asks the program to stop. */
export function stopSignal() {
  return controller.signal;
}

/** Throws when the program has been asked to stop; call it between two steps. */
export function stepUnlessStopped() {
  controller.signal.throwIfAborted();
}

/** Turns Ctrl-C, SIGTERM and a closed terminal into one request; asking again calls `onImpatience`. */
export function listenForStop(onImpatience = () => undefined) {
  for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(name, () => {
      if (controller.signal.aborted) onImpatience();
      else controller.abort(name);
    });
  }
}

/** What a shell reports for a program ended by this signal. */
export function exitCodeForStop() {
  return { SIGHUP: 129, SIGINT: 130, SIGTERM: 143 }[controller.signal.reason] ?? 1;
}
