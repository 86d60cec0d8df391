'use client';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'next/navigation';
import { useMemo } from 'react';
import { api } from './api';
import { indexOf } from './demands';

/** A revision with its building and analysis, read once and shared by its pages. */
export function useRevision() {
  const { projectId, revisionId } = useParams<{ projectId: string; revisionId: string }>();
  const revision = useQuery({ queryKey: ['revision', revisionId], queryFn: () => api.revision(projectId, revisionId) });
  // A saved building gets a new version, and with it new results.
  const version = revision.data?.version;
  const building = useQuery({
    queryKey: ['building', revisionId, version],
    queryFn: () => api.building(projectId, revisionId),
    enabled: version !== undefined,
    staleTime: Infinity,
  });
  const analysis = useQuery({
    queryKey: ['analysis', revisionId, version],
    queryFn: () => api.analysis(projectId, revisionId),
    enabled: version !== undefined,
    staleTime: Infinity,
  });
  const index = useMemo(() => (analysis.data === undefined ? undefined : indexOf(analysis.data)), [analysis.data]);
  return {
    projectId,
    revisionId,
    revision: revision.data,
    building: building.data,
    analysis: analysis.data,
    index,
    error: revision.error ?? building.error ?? analysis.error,
  };
}
