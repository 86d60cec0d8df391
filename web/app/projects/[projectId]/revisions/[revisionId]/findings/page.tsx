'use client';
import type { Certificate, Finding } from '@groundward/engine/path/result';
import Link from 'next/link';
import type { Facts } from '@/lib/demands';
import { dimension, scientific, words } from '@/lib/format';
import { useQueryState } from '@/lib/query-state';
import { useRevision } from '@/lib/revision-data';
import { Pending } from '@/parts/problem';
import { Select } from '@/parts/select';
import { Table } from '@/parts/table';
import { severitySign } from '@/parts/title-block';

const ORDER: readonly Finding['severity'][] = ['open-end', 'warning', 'note'];

export default function FindingsPage() {
  const { root, facts, error } = useRevision();
  if (facts === undefined) return <Pending error={error} what="the findings" />;
  return (
    <div className="stack">
      <Findings facts={facts} root={root} />
      <CertificateOf certificate={facts.analysis.certificate} />
    </div>
  );
}

/** The work list: open ends of the path first. */
function Findings({ facts, root }: { readonly facts: Facts; readonly root: string }) {
  const [severity, setSeverity] = useQueryState('severity', '');
  const [code, setCode] = useQueryState('code', '');
  const all = [...facts.analysis.findings].sort((a, b) => ORDER.indexOf(a.severity) - ORDER.indexOf(b.severity));
  const rows = all.filter(
    (finding) => (severity === '' || finding.severity === severity) && (code === '' || finding.code === code),
  );
  return (
    <section>
      <div className="bar">
        <h1 style={{ marginRight: 12 }}>Findings</h1>
        <Select
          label="Severity"
          value={severity}
          options={[
            { value: '', name: 'all' },
            ...ORDER.map((value) => ({
              value,
              name: `${severitySign(value)} ${words(value)} (${all.filter((finding) => finding.severity === value).length})`,
            })),
          ]}
          onChange={setSeverity}
        />
        <Select
          label="Code"
          value={code}
          options={[
            { value: '', name: 'all' },
            ...[...new Set(all.map((finding) => finding.code))].map((value) => ({ value, name: value })),
          ]}
          onChange={setCode}
        />
        <span className="note">{`${rows.length} of ${all.length}: what is still to be settled, open ends of the path first`}</span>
      </div>
      <Table label="Findings" className="sentences">
        <thead>
          <tr>
            <th>Severity</th>
            <th>Code</th>
            <th>Member</th>
            <th>Finding</th>
            <th>Case</th>
            <th>Numbers</th>
          </tr>
        </thead>
        <tbody>
          {rows.map((finding) => (
            <tr key={`${finding.code} ${finding.member} ${finding.case ?? ''}`}>
              <td>
                <span className={`tag ${finding.severity}`}>
                  {`${severitySign(finding.severity)} ${words(finding.severity)}`}
                </span>
              </td>
              <td className="mono">{finding.code}</td>
              <th scope="row">
                <Link href={hrefOf(finding, facts, root)}>{finding.member}</Link>
              </th>
              <td className="wrap">{finding.sentence}</td>
              <td>{finding.case ?? ''}</td>
              <td>
                {Object.entries(finding.numbers ?? {})
                  .map(([name, value]) => `${name} ${dimension(value)}`)
                  .join(', ')}
              </td>
            </tr>
          ))}
          {rows.length === 0 && (
            <tr>
              <td colSpan={6}>None.</td>
            </tr>
          )}
        </tbody>
      </Table>
    </section>
  );
}

/** The view that shows the member: its wall line or its level. */
function hrefOf(finding: Finding, { building }: Facts, root: string): string {
  const [first = ''] = finding.member.split('/');
  const query = new URLSearchParams(finding.case === undefined ? {} : { case: finding.case });
  const isLine = building.wallLines.some(({ id }) => id === first);
  if (isLine) query.set('line', first);
  else if (building.levels.some(({ id }) => id === first)) query.set('level', first);
  return `${root}/${isLine ? 'wall-line' : 'level'}?${query.toString()}`;
}

function CertificateOf({ certificate }: { readonly certificate: Certificate }) {
  return (
    <section className="panel" id="certificate">
      <h2>Certificate</h2>
      <p>
        {`Every analysis ends with its equilibrium residuals, relative to the forces involved. The largest is ${scientific(certificate.worstResidual, 2)} (${certificate.worst}); above ${scientific(certificate.bound, 0)} the analysis would have been refused.`}
      </p>
      <div style={{ maxWidth: 640 }}>
        <Table label="Checks of the certificate">
          <thead>
            <tr>
              <th>Check</th>
              <th className="n">Largest residual</th>
              <th>Bound</th>
            </tr>
          </thead>
          <tbody>
            {certificate.checks.map((check) => (
              <tr key={check.what}>
                <th scope="row">{check.what}</th>
                <td className="n">{scientific(check.residual, 2)}</td>
                <td>{check.residual <= certificate.bound ? '✓ below' : '✕ above'}</td>
              </tr>
            ))}
          </tbody>
        </Table>
      </div>
    </section>
  );
}
