'use client';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { api } from '@/lib/api';
import { when, words } from '@/lib/format';
import { Pending, ProblemView } from '@/parts/problem';
import { Table } from '@/parts/table';
import { StateTag } from '@/parts/title-block';

export default function Projects() {
  const projects = useQuery({ queryKey: ['projects'], queryFn: api.projects });
  const client = useQueryClient();
  const router = useRouter();
  const [name, setName] = useState('');
  const [error, setError] = useState<unknown>(null);
  const create = async (): Promise<void> => {
    try {
      const project = await api.createProject(name);
      await client.invalidateQueries({ queryKey: ['projects'] });
      router.push(`/projects/${project.id}`);
    } catch (failure) {
      setError(failure);
    }
  };
  return (
    <main className="stack">
      <h1>Projects</h1>
      {projects.data === undefined ? (
        <Pending error={projects.error} what="projects" />
      ) : (
        <Table label="Projects">
          <thead>
            <tr>
              <th>Project</th>
              <th>Latest revision</th>
              <th>State</th>
              <th>Your role</th>
              <th>Changed</th>
            </tr>
          </thead>
          <tbody>
            {projects.data.map((project) => (
              <tr key={project.id}>
                <th scope="row" className="wrap">
                  <Link href={`/projects/${project.id}`}>{project.name}</Link>
                </th>
                <td>
                  {project.latest === null ? (
                    'none yet'
                  ) : (
                    <Link
                      href={`/projects/${project.id}/revisions/${project.latest.id}/level`}
                    >{`${project.latest.number} ${project.latest.name}`}</Link>
                  )}
                </td>
                <td>{project.latest !== null && <StateTag state={project.latest.state} />}</td>
                <td>{words(project.role)}</td>
                <td>{when(project.updatedAt)}</td>
              </tr>
            ))}
            {projects.data.length === 0 && (
              <tr>
                <td colSpan={5}>No project yet. Name one below, then upload a building file into it.</td>
              </tr>
            )}
          </tbody>
        </Table>
      )}
      <form
        className="bar"
        onSubmit={(event) => {
          event.preventDefault();
          void create();
        }}
      >
        <label>
          New project
          <input value={name} onChange={(event) => setName(event.target.value)} required maxLength={200} />
        </label>
        <button>Make it</button>
      </form>
      <ProblemView error={error} />
    </main>
  );
}
