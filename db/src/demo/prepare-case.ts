import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { AcceptService } from '@weighhouse/server/cases/accept.service';
import { DraftsService } from '@weighhouse/server/cases/drafts.service';
import { ReferrerMoves } from '@weighhouse/server/cases/referrer-moves.service';
import { CandidateChanges } from '@weighhouse/server/findings/candidate-changes.service';
import { FindingChanges } from '@weighhouse/server/findings/finding-changes.service';
import { ChangeSettingsService } from '@weighhouse/server/findings/change-settings.service';
import { ReportUploads } from '@weighhouse/server/reports/report-uploads.service';
import { IdentityCardsService } from '@weighhouse/server/summaries/identity-cards.service';
import { conferenceNextWeek, type DemoCalendar } from './calendar.js';
import { type DemoCase, type DemoReport, network } from './demo-case.js';
import { historyHtml } from './history-html.js';
import { writeReportPdf } from './report-pdf.js';
import type { Stage } from './stage.js';

export interface PreparedCase {
  caseId: string;
  candidateSet: number;
  /** @param key of a finding or a test in the story */
  findingId: (key: string) => string;
}

/** The referrer's part: draft, identity card, reports, submitted. */
export async function refer(
  stage: Stage,
  story: DemoCase,
  calendar: DemoCalendar,
): Promise<{ caseId: string; reports: Map<string, string> }> {
  const referrer = stage.actor(story.referrer);
  const { id: caseId } = await stage.service(DraftsService).open(referrer, {
    question: story.question,
    age: story.age,
    sex: story.sex,
    urgency: story.urgency,
    urgencyReason: story.urgencyReason,
    consent: { ...story.consent, givenOn: calendar.day(story.consent.givenOn) },
    historyHtml: historyHtml(story, calendar),
  });
  const { birthDate, ...identity } = story.identity;
  await stage
    .service(IdentityCardsService)
    .write(referrer, caseId, { version: 0, ...identity, birthDate: calendar.day(birthDate) });
  const reports = new Map<string, string>();
  for (const report of story.reports) {
    reports.set(report.key, await upload(stage, story, caseId, report, calendar));
  }
  await stage.service(ReferrerMoves).submit(referrer, caseId, undefined);
  return { caseId, reports };
}

/** The chair's part: team with weights, conference of next week. */
export async function accept(stage: Stage, story: DemoCase, caseId: string): Promise<void> {
  await stage.service(AcceptService).accept(stage.actor(story.chair), caseId, {
    conferenceAt: conferenceNextWeek(stage.now(), story.conferenceTime).toISOString(),
    team: [
      ...story.contributors.map(({ id, weight, weightReason }) => ({
        personId: stage.actor(id).id,
        part: 'contributor' as const,
        weight,
        ...(weightReason === null ? {} : { reason: weightReason }),
      })),
      { personId: stage.actor(story.liaison).id, part: 'liaison' as const },
    ],
  });
}

/** Candidates, findings, what double counts, and the tests that are not done yet as pending findings. */
export async function layOutEvidence(
  stage: Stage,
  story: DemoCase,
  { caseId, reports }: { caseId: string; reports: Map<string, string> },
  calendar: DemoCalendar,
): Promise<PreparedCase> {
  const chair = stage.actor(story.chair);
  const writer = stage.actor(story.contributors[0]?.id ?? story.chair);
  for (const { name, detail, mustNotMiss } of story.candidates) {
    await stage.service(CandidateChanges).add(chair, caseId, { name, detail, mustNotMiss });
  }
  const groups = await groupsOf(stage, story, caseId);
  const ids = new Map<string, string>();
  for (const finding of story.findings) {
    const group = story.groups.find((one) => one.members.includes(finding.key));
    const added = await stage.service(FindingChanges).add(writer, caseId, {
      title: finding.title,
      kind: finding.kind,
      detail: finding.detail ?? '',
      observed: 1,
      observedOn: calendar.day(finding.on),
      reliability: finding.reliability,
      groupId: group ? (groups.get(group.label) ?? null) : null,
      source: finding.report ? { reportId: reports.get(finding.report) ?? null, page: 1 } : null,
    });
    ids.set(finding.key, added.id);
  }
  for (const { key, title, kind, detail, cost, waitDays, burden, levelLabels } of story.tests) {
    const pending = {
      title,
      kind,
      detail,
      cost,
      waitDays,
      burden,
      levelLabels,
      observed: null,
      reliability: 'firm' as const,
    };
    ids.set(key, (await stage.service(FindingChanges).add(writer, caseId, pending)).id);
  }
  return {
    caseId,
    candidateSet: story.candidates.length,
    findingId: (key) => {
      const id = ids.get(key);
      if (id === undefined) throw new Error(`The story has no finding ${key}.`);
      return id;
    },
  };
}

/**
 * The story gives each group the exponent d that its n findings count with; the product asks for the overlap
 * o of 1 / (1 + (n − 1) o) = d.
 */
async function groupsOf(stage: Stage, story: DemoCase, caseId: string): Promise<Map<string, string>> {
  const settings = await stage.service(ChangeSettingsService).change(stage.actor(story.chair), caseId, {
    groups: story.groups.map(({ label, reason, discount, members }) => ({
      label,
      reason,
      overlap: Math.round(((1 / discount - 1) / (members.length - 1)) * 1000) / 1000,
    })),
    reason: 'Findings that one mechanism explains must not count in full each.',
  });
  return new Map(settings.groups.map((group) => [group.label, group.id]));
}

async function upload(
  stage: Stage,
  story: DemoCase,
  caseId: string,
  report: DemoReport,
  calendar: DemoCalendar,
): Promise<string> {
  const folder = await mkdtemp(path.join(tmpdir(), 'weighhouse-demo-'));
  try {
    const file = path.join(folder, 'report.pdf');
    const day = calendar.day(report.on);
    const centre = network.centres.find((one) => one.code === report.centre)?.name ?? report.centre;
    await writeReportPdf(file, report, { centre, day, network: network.name });
    const added = await stage.service(ReportUploads).add(stage.actor(story.referrer), caseId, {
      fileName: `${report.title}, ${day}.pdf`,
      mediaType: 'application/pdf',
      content: await readFile(file),
    });
    return added.id;
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}
