'use client';
import type { Finding } from '@groundward/engine/path/result';
import Link from 'next/link';
import { figure } from '@/lib/format';
import { useRevision } from '@/lib/revision-data';
import { Pending } from '@/parts/problem';

const ORDER: readonly Finding['severity'][] = ['open-end', 'warning', 'note'];

export default function FindingsPage() {
  const { projectId, revisionId, building, analysis, error } = useRevision();
  if (building === undefined || analysis === undefined) return <Pending error={error} what="the findings" />;
  const root = `/projects/${projectId}/revisions/${revisionId}`;
  const lines = new Set(building.wallLines.map((line) => line.id));
  const href = (member: string): string => {
    const first = member.split('/')[0] ?? '';
    return lines.has(first)
      ? `${root}/wall-line?line=${encodeURIComponent(first)}`
      : `${root}/level?level=${encodeURIComponent(first)}`;
  };
  const findings = [...analysis.findings].sort((a, b) => ORDER.indexOf(a.severity) - ORDER.indexOf(b.severity));
  const { certificate } = analysis;
  return (
    <div className="stack">
      <section>
        <h1>Findings</h1>
        <p className="note">What the engineer still has to settle: open ends of the path first.</p>
        <div className="scroll">
          <table>
            <thead>
              <tr>
                <th>Severity</th>
                <th>Code</th>
                <th>Member</th>
                <th>Finding</th>
                <th>Numbers</th>
              </tr>
            </thead>
            <tbody>
              {findings.map((finding, i) => (
                <tr key={i}>
                  <td>
                    <span className={`tag ${finding.severity}`}>{finding.severity}</span>
                  </td>
                  <td>{finding.code}</td>
                  <td>
                    <Link href={href(finding.member)}>{finding.member}</Link>
                  </td>
                  <td className="wrap">{finding.sentence}</td>
                  <td>
                    {Object.entries(finding.numbers ?? {})
                      .map(([name, value]) => `${name} ${figure(value)}`)
                      .join(', ')}
                  </td>
                </tr>
              ))}
              {findings.length === 0 && (
                <tr>
                  <td colSpan={5}>None.</td>
                </tr>
              )}
            </tbody>
          </table>
        </div>
      </section>
      <section className="panel" id="certificate">
        <h2>Certificate</h2>
        <p>
          {`Every analysis ends with its equilibrium residuals, relative to the forces involved. The largest is ${certificate.worstResidual.toExponential(2)} (${certificate.worst}); above ${certificate.bound.toExponential(0)} the analysis would have been refused.`}
        </p>
        <div className="scroll" style={{ maxWidth: 640 }}>
          <table>
            <thead>
              <tr>
                <th>Check</th>
                <th className="n">Largest residual</th>
              </tr>
            </thead>
            <tbody>
              {certificate.checks.map((check) => (
                <tr key={check.what}>
                  <td>{check.what}</td>
                  <td className="n">{check.residual.toExponential(2)}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      </section>
    </div>
  );
}
