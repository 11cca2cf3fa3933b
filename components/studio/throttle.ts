/** Calls at once, then at most every `wait` milliseconds, the last call never lost. */
export function throttle(work: () => void, wait: number) {
  let timer: ReturnType<typeof setTimeout> | undefined;
  let pending = false;
  const run = (): void => {
    pending = false;
    work();
    timer = setTimeout(() => {
      timer = undefined;
      if (pending) run();
    }, wait);
  };
  return {
    call(): void {
      if (timer === undefined) run();
      else pending = true;
    },
    /** does now what is still to be done */
    flush(): void {
      if (pending) run();
    },
    cancel(): void {
      clearTimeout(timer);
      timer = undefined;
      pending = false;
    },
  };
}
