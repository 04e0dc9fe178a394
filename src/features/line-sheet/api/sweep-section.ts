import { queryOptions, useQuery } from '@tanstack/react-query';
import type { OverheadSection } from '#shared/engine/index';
import { runSweep } from '../../../lib/worker/run-sweep';

const LOWEST_HZ = 1;
const HIGHEST_HZ = 1e6;
const POINTS = 121;

/** A section over frequency, computed once a section in the worker and kept: a filed line never changes. */
export const sweepQuery = (lineHash: string, index: number, section: OverheadSection | null) =>
  queryOptions({
    queryKey: ['sweep', lineHash, index],
    queryFn: () => {
      if (section === null) throw new Error('a section without geometry has no sweep');
      return runSweep({ section, lowHz: LOWEST_HZ, highHz: HIGHEST_HZ, points: POINTS });
    },
    enabled: section !== null,
    staleTime: Infinity,
  });

export const useSweep = (lineHash: string, index: number, section: OverheadSection | null) =>
  useQuery(sweepQuery(lineHash, index, section));
