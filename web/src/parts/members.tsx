'use client';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { api, type ProjectDetail, type Role } from '@/lib/api';
import { words } from '@/lib/format';
import { ProblemView } from './problem';
import { Select } from './select';
import { Table } from './table';

const ROLES: readonly Role[] = ['owner', 'engineer', 'checker', 'foundation-designer', 'reader'];

/** Who is in the project; its owners let others in. */
export function Members({ project }: { readonly project: ProjectDetail }) {
  const client = useQueryClient();
  const [email, setEmail] = useState('');
  const [role, setRole] = useState<Role>('engineer');
  const [link, setLink] = useState<string | null>(null);
  const [error, setError] = useState<unknown>(null);
  const owner = project.role === 'owner';
  const attempt = async (work: () => Promise<void>): Promise<void> => {
    setError(null);
    setLink(null);
    try {
      await work();
      await client.invalidateQueries({ queryKey: ['project', project.id] });
    } catch (failure) {
      setError(failure);
    }
  };
  const add = (): Promise<void> =>
    attempt(async () => {
      const answer = await api.addMember(project.id, email, role);
      if (answer.invitation !== null) setLink(`${window.location.origin}/invitation?token=${answer.invitation}`);
      setEmail('');
    });
  return (
    <section className="panel">
      <h2>People</h2>
      <Table label="People">
        <tbody>
          {project.members.map((member) => (
            <tr key={member.userId}>
              <th scope="row">{member.name}</th>
              <td>{member.email}</td>
              <td>{words(member.role)}</td>
              <td>
                {owner && (
                  <button
                    className="quiet"
                    onClick={() =>
                      void attempt(async () => {
                        await api.removeMember(project.id, member.userId);
                      })
                    }
                  >
                    Remove
                  </button>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </Table>
      {owner && (
        <form
          className="bar"
          style={{ marginTop: 10 }}
          onSubmit={(event) => {
            event.preventDefault();
            void add();
          }}
        >
          <label>
            E-mail
            <input type="email" value={email} onChange={(event) => setEmail(event.target.value)} required />
          </label>
          <Select
            label="Role"
            value={role}
            options={ROLES.map((value) => ({ value, name: words(value) }))}
            onChange={(value) => setRole(value as Role)}
          />
          <button>Let in</button>
        </form>
      )}
      {link !== null && (
        <p>
          Nobody has an account with this address yet. Send this link, which works once: <code>{link}</code>
        </p>
      )}
      <ProblemView error={error} />
    </section>
  );
}
