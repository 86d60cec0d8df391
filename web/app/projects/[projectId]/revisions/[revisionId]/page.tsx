import { redirect } from 'next/navigation';

export default async function Revision({
  params,
}: {
  readonly params: Promise<{ projectId: string; revisionId: string }>;
}) {
  const { projectId, revisionId } = await params;
  redirect(`/projects/${projectId}/revisions/${revisionId}/level`);
}
