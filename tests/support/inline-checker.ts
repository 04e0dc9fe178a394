import type { Checker } from '#server/integrations/checker';

/** The real check on the test's own thread: a worker thread for each test file would only cost time. */
export const inlineChecker: Checker = {
  check: async ({ filing, rules }) => {
    const { checkFiling } = await import('#shared/checks/check-filing');
    return checkFiling(filing, rules, {});
  },
  close: async () => undefined,
};
