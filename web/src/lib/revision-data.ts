'use client';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'next/navigation';
import { useMemo } from 'react';
import { api } from './api';
import { indexOf, type Facts } from './demands';

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
    queryFn: async () => {
      const analysis = await api.analysis(projectId, revisionId);
      return { analysis, index: indexOf(analysis) };
    },
    enabled: version !== undefined,
    staleTime: Infinity,
    structuralSharing: false,
  });
  const facts = useMemo<Facts | undefined>(
    () =>
      building.data === undefined || analysis.data === undefined
        ? undefined
        : { building: building.data, ...analysis.data },
    [building.data, analysis.data],
  );
  return {
    projectId,
    revisionId,
    root: `/projects/${projectId}/revisions/${revisionId}`,
    revision: revision.data,
    building: building.data,
    facts,
    analysis: facts?.analysis,
    index: facts?.index,
    error: revision.error ?? building.error ?? analysis.error,
  };
}
