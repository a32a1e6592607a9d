import type { MigrationInterface, QueryRunner } from 'typeorm';

export class Initial1796000000000 implements MigrationInterface {
  name = 'Initial1796000000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(
      `CREATE TABLE \`case_counter\` (\`year\` int NOT NULL, \`last\` int NOT NULL, PRIMARY KEY (\`year\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`case_file\` (\`id\` char(36) NOT NULL, \`number\` varchar(12) NOT NULL, \`state\` varchar(20) NOT NULL, \`version\` int NOT NULL DEFAULT '1', \`revision\` int NOT NULL DEFAULT '1', \`referrerId\` char(36) NOT NULL, \`question\` varchar(300) NOT NULL DEFAULT '', \`age\` int NULL, \`sex\` varchar(10) NULL, \`urgency\` varchar(20) NULL, \`urgencyReason\` varchar(1000) NOT NULL DEFAULT '', \`consentGiven\` tinyint NULL, \`consentHow\` varchar(10) NULL, \`consentGivenOn\` date NULL, \`historyHtml\` mediumtext NOT NULL, \`conferenceAt\` datetime(3) NULL, \`quorum\` int NOT NULL DEFAULT '3', \`tempering\` double NOT NULL, \`coexistence\` double NOT NULL, \`candidateSet\` int NOT NULL DEFAULT '0', \`roundNumber\` int NULL, \`roundKind\` varchar(10) NULL, \`roundOpen\` tinyint NOT NULL DEFAULT 0, \`roundHandedIn\` int NOT NULL DEFAULT '0', \`leaderName\` varchar(160) NULL, \`leaderShare\` double NULL, \`disagreementBits\` double NULL, \`lastMove\` varchar(20) NULL, \`lastWords\` text NULL, \`lastWordsById\` char(36) NULL, \`lastWordsAt\` datetime(3) NULL, \`submittedAt\` datetime(3) NULL, \`acceptedAt\` datetime(3) NULL, \`concludedAt\` datetime(3) NULL, \`createdAt\` datetime(3) NOT NULL, \`updatedAt\` datetime(3) NOT NULL, INDEX \`IDX_08d712d46bad09516a638842d5\` (\`state\`, \`updatedAt\`), UNIQUE INDEX \`IDX_992e894a9029ed30bfecd12ab8\` (\`number\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`team_member\` (\`id\` bigint UNSIGNED NOT NULL AUTO_INCREMENT, \`caseId\` char(36) NOT NULL, \`personId\` char(36) NOT NULL, \`part\` varchar(12) NOT NULL, \`weight\` double NULL, \`reason\` text NULL, \`addedAt\` datetime(3) NOT NULL, \`leftAt\` datetime(3) NULL, INDEX \`IDX_da6e300ef08afbd93fa4b42701\` (\`personId\`), UNIQUE INDEX \`IDX_d79602e223fe4417ff8a71e54f\` (\`caseId\`, \`personId\`, \`part\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`judgement_draft\` (\`caseId\` char(36) NOT NULL, \`personId\` char(36) NOT NULL, \`target\` varchar(36) NOT NULL, \`candidateSet\` int NOT NULL, \`exposure\` varchar(10) NULL, \`typed\` text NOT NULL, \`reason\` text NOT NULL, \`savedAt\` datetime(3) NOT NULL, PRIMARY KEY (\`caseId\`, \`personId\`, \`target\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`judgement_value\` (\`id\` bigint UNSIGNED NOT NULL AUTO_INCREMENT, \`judgementVersionId\` char(36) NOT NULL, \`candidateId\` char(36) NULL, \`level\` int NOT NULL, \`thousandths\` int NOT NULL, INDEX \`IDX_e525db97f45f9ffcbfda8375fe\` (\`judgementVersionId\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`judgement_version\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`personId\` char(36) NOT NULL, \`roundId\` char(36) NOT NULL, \`version\` int NOT NULL, \`target\` varchar(36) NOT NULL, \`candidateSet\` int NOT NULL, \`exposure\` varchar(10) NULL, \`reason\` text NULL, \`savedAt\` datetime(3) NOT NULL, UNIQUE INDEX \`IDX_bce3a1bcc2cd38be19d731a17e\` (\`caseId\`, \`personId\`, \`version\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`standing_share\` (\`snapshotId\` char(36) NOT NULL, \`position\` int NOT NULL, \`candidateId\` char(36) NULL, \`name\` varchar(160) NOT NULL, \`share\` double NOT NULL, PRIMARY KEY (\`snapshotId\`, \`position\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`standing_snapshot\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`roundId\` char(36) NULL, \`candidateSet\` int NOT NULL, \`method\` varchar(40) NOT NULL, \`takenAt\` datetime(3) NOT NULL, INDEX \`IDX_5fca0904336ffdb6b51707d097\` (\`caseId\`, \`takenAt\`), UNIQUE INDEX \`IDX_bdbe0b832c555697c008290fc0\` (\`roundId\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`hand_in\` (\`roundId\` char(36) NOT NULL, \`personId\` char(36) NOT NULL, \`handedInAt\` datetime(3) NOT NULL, \`version\` int NOT NULL, \`digest\` char(64) NOT NULL, \`random\` char(64) NOT NULL, \`text\` mediumtext NOT NULL, PRIMARY KEY (\`roundId\`, \`personId\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`round_absence\` (\`roundId\` char(36) NOT NULL, \`personId\` char(36) NOT NULL, PRIMARY KEY (\`roundId\`, \`personId\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`round\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`number\` int NOT NULL, \`kind\` varchar(10) NOT NULL, \`state\` varchar(10) NOT NULL, \`candidateSet\` int NOT NULL, \`openedAt\` datetime(3) NOT NULL, \`openedById\` char(36) NOT NULL, \`deadline\` datetime(3) NULL, \`unsealedAt\` datetime(3) NULL, \`unsealReason\` text NULL, \`closedAt\` datetime(3) NULL, UNIQUE INDEX \`IDX_73e04434484a083cd10adc0d22\` (\`caseId\`, \`number\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`candidate_pair\` (\`aId\` char(36) NOT NULL, \`bId\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`times\` double NOT NULL, \`reason\` text NOT NULL, INDEX \`IDX_cbccae6d5ec38a169ac61f663b\` (\`caseId\`), PRIMARY KEY (\`aId\`, \`bId\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`candidate\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`position\` int NOT NULL, \`name\` varchar(160) NOT NULL, \`detail\` varchar(1000) NOT NULL DEFAULT '', \`mustNotMiss\` tinyint NOT NULL DEFAULT 0, \`addedInSet\` int NOT NULL, \`retiredInSet\` int NULL, \`retiredWords\` text NULL, \`addedById\` char(36) NOT NULL, \`addedAt\` datetime(3) NOT NULL, \`retiredById\` char(36) NULL, \`retiredAt\` datetime(3) NULL, UNIQUE INDEX \`IDX_7234f333cc92ad42f7ab086507\` (\`caseId\`, \`position\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`finding_group\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`position\` int NOT NULL, \`label\` varchar(120) NOT NULL, \`overlap\` double NOT NULL, \`reason\` text NULL, INDEX \`IDX_37462f62dce202d45bb048721c\` (\`caseId\`, \`position\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`finding_level\` (\`findingId\` char(36) NOT NULL, \`position\` int NOT NULL, \`label\` varchar(80) NOT NULL, PRIMARY KEY (\`findingId\`, \`position\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`finding\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`position\` int NOT NULL, \`version\` int NOT NULL DEFAULT '1', \`title\` varchar(300) NOT NULL, \`detail\` varchar(2000) NOT NULL DEFAULT '', \`kind\` varchar(12) NOT NULL, \`observed\` int NULL, \`reliability\` double NOT NULL, \`groupId\` char(36) NULL, \`observedOn\` date NULL, \`cost\` double NULL, \`waitDays\` double NULL, \`burden\` double NULL, \`sourceReportId\` char(36) NULL, \`sourcePage\` int NULL, \`sourceText\` varchar(300) NULL, \`errorWords\` text NULL, \`errorById\` char(36) NULL, \`errorAt\` datetime(3) NULL, \`addedById\` char(36) NOT NULL, \`addedAt\` datetime(3) NOT NULL, INDEX \`IDX_547f0691ba4844ea2c1eec8fd5\` (\`sourceReportId\`), UNIQUE INDEX \`IDX_d18e3d7151777d1051881bd77b\` (\`caseId\`, \`position\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`settings_change\` (\`id\` bigint UNSIGNED NOT NULL AUTO_INCREMENT, \`caseId\` char(36) NOT NULL, \`changedById\` char(36) NOT NULL, \`changedAt\` datetime(3) NOT NULL, \`coexistence\` double NOT NULL, \`tempering\` double NOT NULL, \`quorum\` int NOT NULL, \`conferenceAt\` datetime(3) NULL, \`reason\` text NOT NULL, INDEX \`IDX_c05288c89122c1de48f7d0a123\` (\`caseId\`, \`id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`outcome\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`candidateId\` char(36) NULL, \`diagnosis\` varchar(300) NOT NULL, \`howKnown\` text NOT NULL, \`knownOn\` date NOT NULL, \`recordedById\` char(36) NOT NULL, \`recordedAt\` datetime(3) NOT NULL, INDEX \`IDX_0b5577d36e3ceac49c9c2645b7\` (\`caseId\`, \`recordedAt\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`centre\` (\`id\` char(36) NOT NULL, \`code\` varchar(12) NOT NULL, \`name\` varchar(120) NOT NULL, \`createdAt\` datetime(3) NOT NULL, UNIQUE INDEX \`IDX_1705e603b7451c5c4a22a2d394\` (\`code\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`invitation\` (\`id\` char(36) NOT NULL, \`personId\` char(36) NOT NULL, \`tokenHash\` char(64) NOT NULL, \`createdAt\` datetime(3) NOT NULL, \`expiresAt\` datetime(3) NOT NULL, \`usedAt\` datetime(3) NULL, \`withdrawnAt\` datetime(3) NULL, INDEX \`IDX_1b17ab18758ab21dfa7c2535c3\` (\`personId\`), UNIQUE INDEX \`IDX_676ef6471ce7176869d73365a4\` (\`tokenHash\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`person_role\` (\`personId\` char(36) NOT NULL, \`role\` varchar(16) NOT NULL, INDEX \`IDX_b63166e260f6ff5c706dd57f28\` (\`role\`), PRIMARY KEY (\`personId\`, \`role\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`person\` (\`id\` char(36) NOT NULL, \`email\` varchar(254) NOT NULL, \`name\` varchar(120) NOT NULL, \`specialty\` varchar(120) NOT NULL, \`centreId\` char(36) NOT NULL, \`passwordHash\` varchar(255) NULL, \`accepted\` tinyint NOT NULL DEFAULT 0, \`active\` tinyint NOT NULL DEFAULT 1, \`version\` int NOT NULL, \`createdAt\` datetime(3) NOT NULL, UNIQUE INDEX \`IDX_d2d717efd90709ebd3cb26b936\` (\`email\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`session\` (\`id\` char(36) NOT NULL, \`personId\` char(36) NOT NULL, \`createdAt\` datetime(3) NOT NULL, \`expiresAt\` datetime(3) NOT NULL, \`revokedAt\` datetime(3) NULL, \`lastSeenAt\` datetime(3) NOT NULL, \`userAgent\` varchar(255) NOT NULL, INDEX \`IDX_7d424557d04fbfb559950f972f\` (\`personId\`, \`revokedAt\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`plan_action\` (\`id\` char(36) NOT NULL, \`planId\` char(36) NOT NULL, \`position\` int NOT NULL, \`what\` varchar(500) NOT NULL, \`ownerId\` char(36) NULL, \`due\` date NULL, \`concernsPatient\` tinyint NOT NULL, \`doneAt\` datetime(3) NULL, \`doneById\` char(36) NULL, \`doneWords\` text NULL, INDEX \`IDX_1e88a1fce6b2f30cd5ff182a29\` (\`ownerId\`, \`doneAt\`), INDEX \`IDX_5aab98ecb1ab660a18e3ce6389\` (\`planId\`, \`position\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`plan_asking\` (\`planId\` char(36) NOT NULL, \`personId\` char(36) NOT NULL, \`askedAt\` datetime(3) NOT NULL, PRIMARY KEY (\`planId\`, \`personId\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`plan_stance\` (\`id\` bigint UNSIGNED NOT NULL AUTO_INCREMENT, \`planId\` char(36) NOT NULL, \`personId\` char(36) NOT NULL, \`stance\` varchar(10) NOT NULL, \`words\` text NULL, \`at\` datetime(3) NOT NULL, INDEX \`IDX_643dac6aed48380114dfad0b3b\` (\`planId\`, \`personId\`, \`id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`plan\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`number\` int NOT NULL, \`version\` int NOT NULL, \`workingDiagnosis\` varchar(500) NOT NULL, \`candidateId\` char(36) NULL, \`certainty\` varchar(20) NULL, \`remainingDoubt\` text NOT NULL, \`safetyNet\` text NOT NULL, \`changedAt\` datetime(3) NOT NULL, \`changedById\` char(36) NOT NULL, \`askedAt\` datetime(3) NULL, \`signedAt\` datetime(3) NULL, \`signedById\` char(36) NULL, \`snapshotId\` char(36) NULL, UNIQUE INDEX \`IDX_03de5c1078d914c8f39ac260e8\` (\`caseId\`, \`number\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`audit_entry\` (\`id\` bigint UNSIGNED NOT NULL AUTO_INCREMENT, \`at\` datetime(3) NOT NULL, \`caseId\` char(36) NULL, \`actorId\` char(36) NULL, \`action\` varchar(60) NOT NULL, \`sentence\` text NOT NULL, \`sealedRoundId\` char(36) NULL, INDEX \`IDX_58cf8b4a11c0645e4b751bbc99\` (\`caseId\`, \`id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`outbox_mail\` (\`id\` bigint UNSIGNED NOT NULL AUTO_INCREMENT, \`recipient\` varchar(254) NOT NULL, \`subject\` varchar(200) NOT NULL, \`body\` text NOT NULL, \`createdAt\` datetime(3) NOT NULL, \`nextAttemptAt\` datetime(3) NOT NULL, \`attempts\` int NOT NULL DEFAULT '0', \`sentAt\` datetime(3) NULL, INDEX \`IDX_9006cd931f41ac181ddbbda786\` (\`sentAt\`, \`nextAttemptAt\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`report\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`fileName\` varchar(200) NOT NULL, \`mediaType\` varchar(60) NOT NULL, \`sizeBytes\` int NOT NULL, \`sha256\` char(64) NOT NULL, \`storageKey\` varchar(80) NOT NULL, \`uploadedById\` char(36) NOT NULL, \`uploadedAt\` datetime(3) NOT NULL, \`removedAt\` datetime(3) NULL, INDEX \`IDX_b34055c30b5fb692c470bb4c6c\` (\`caseId\`, \`uploadedAt\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`contact\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`at\` datetime(3) NOT NULL, \`how\` varchar(12) NOT NULL, \`reached\` tinyint NOT NULL, \`understood\` varchar(8) NULL, \`questions\` text NOT NULL, \`notes\` text NOT NULL, \`toldPlanNumber\` int NULL, \`byId\` char(36) NOT NULL, \`recordedAt\` datetime(3) NOT NULL, INDEX \`IDX_504df1d8112e211a07a7a31547\` (\`caseId\`, \`at\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`identity_card\` (\`caseId\` char(36) NOT NULL, \`version\` int NOT NULL, \`box\` blob NOT NULL, \`changedAt\` datetime(3) NOT NULL, \`changedById\` char(36) NOT NULL, PRIMARY KEY (\`caseId\`)) ENGINE=InnoDB`,
    );
    await runner.query(
      `CREATE TABLE \`summary\` (\`id\` char(36) NOT NULL, \`caseId\` char(36) NOT NULL, \`planNumber\` int NOT NULL, \`version\` int NOT NULL, \`state\` varchar(10) NOT NULL, \`body\` mediumtext NOT NULL, \`returnedWords\` text NULL, \`changedAt\` datetime(3) NOT NULL, \`approvedById\` char(36) NULL, \`approvedAt\` datetime(3) NULL, \`toldAt\` datetime(3) NULL, UNIQUE INDEX \`IDX_b6c2813276bbd689cfba6df405\` (\`caseId\`, \`planNumber\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
    );
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`DROP INDEX \`IDX_b6c2813276bbd689cfba6df405\` ON \`summary\``);
    await runner.query(`DROP TABLE \`summary\``);
    await runner.query(`DROP TABLE \`identity_card\``);
    await runner.query(`DROP INDEX \`IDX_504df1d8112e211a07a7a31547\` ON \`contact\``);
    await runner.query(`DROP TABLE \`contact\``);
    await runner.query(`DROP INDEX \`IDX_b34055c30b5fb692c470bb4c6c\` ON \`report\``);
    await runner.query(`DROP TABLE \`report\``);
    await runner.query(`DROP INDEX \`IDX_9006cd931f41ac181ddbbda786\` ON \`outbox_mail\``);
    await runner.query(`DROP TABLE \`outbox_mail\``);
    await runner.query(`DROP INDEX \`IDX_58cf8b4a11c0645e4b751bbc99\` ON \`audit_entry\``);
    await runner.query(`DROP TABLE \`audit_entry\``);
    await runner.query(`DROP INDEX \`IDX_03de5c1078d914c8f39ac260e8\` ON \`plan\``);
    await runner.query(`DROP TABLE \`plan\``);
    await runner.query(`DROP INDEX \`IDX_643dac6aed48380114dfad0b3b\` ON \`plan_stance\``);
    await runner.query(`DROP TABLE \`plan_stance\``);
    await runner.query(`DROP TABLE \`plan_asking\``);
    await runner.query(`DROP INDEX \`IDX_5aab98ecb1ab660a18e3ce6389\` ON \`plan_action\``);
    await runner.query(`DROP INDEX \`IDX_1e88a1fce6b2f30cd5ff182a29\` ON \`plan_action\``);
    await runner.query(`DROP TABLE \`plan_action\``);
    await runner.query(`DROP INDEX \`IDX_7d424557d04fbfb559950f972f\` ON \`session\``);
    await runner.query(`DROP TABLE \`session\``);
    await runner.query(`DROP INDEX \`IDX_d2d717efd90709ebd3cb26b936\` ON \`person\``);
    await runner.query(`DROP TABLE \`person\``);
    await runner.query(`DROP INDEX \`IDX_b63166e260f6ff5c706dd57f28\` ON \`person_role\``);
    await runner.query(`DROP TABLE \`person_role\``);
    await runner.query(`DROP INDEX \`IDX_676ef6471ce7176869d73365a4\` ON \`invitation\``);
    await runner.query(`DROP INDEX \`IDX_1b17ab18758ab21dfa7c2535c3\` ON \`invitation\``);
    await runner.query(`DROP TABLE \`invitation\``);
    await runner.query(`DROP INDEX \`IDX_1705e603b7451c5c4a22a2d394\` ON \`centre\``);
    await runner.query(`DROP TABLE \`centre\``);
    await runner.query(`DROP INDEX \`IDX_0b5577d36e3ceac49c9c2645b7\` ON \`outcome\``);
    await runner.query(`DROP TABLE \`outcome\``);
    await runner.query(`DROP INDEX \`IDX_c05288c89122c1de48f7d0a123\` ON \`settings_change\``);
    await runner.query(`DROP TABLE \`settings_change\``);
    await runner.query(`DROP INDEX \`IDX_d18e3d7151777d1051881bd77b\` ON \`finding\``);
    await runner.query(`DROP INDEX \`IDX_547f0691ba4844ea2c1eec8fd5\` ON \`finding\``);
    await runner.query(`DROP TABLE \`finding\``);
    await runner.query(`DROP TABLE \`finding_level\``);
    await runner.query(`DROP INDEX \`IDX_37462f62dce202d45bb048721c\` ON \`finding_group\``);
    await runner.query(`DROP TABLE \`finding_group\``);
    await runner.query(`DROP INDEX \`IDX_7234f333cc92ad42f7ab086507\` ON \`candidate\``);
    await runner.query(`DROP TABLE \`candidate\``);
    await runner.query(`DROP INDEX \`IDX_cbccae6d5ec38a169ac61f663b\` ON \`candidate_pair\``);
    await runner.query(`DROP TABLE \`candidate_pair\``);
    await runner.query(`DROP INDEX \`IDX_73e04434484a083cd10adc0d22\` ON \`round\``);
    await runner.query(`DROP TABLE \`round\``);
    await runner.query(`DROP TABLE \`round_absence\``);
    await runner.query(`DROP TABLE \`hand_in\``);
    await runner.query(`DROP INDEX \`IDX_bdbe0b832c555697c008290fc0\` ON \`standing_snapshot\``);
    await runner.query(`DROP INDEX \`IDX_5fca0904336ffdb6b51707d097\` ON \`standing_snapshot\``);
    await runner.query(`DROP TABLE \`standing_snapshot\``);
    await runner.query(`DROP TABLE \`standing_share\``);
    await runner.query(`DROP INDEX \`IDX_bce3a1bcc2cd38be19d731a17e\` ON \`judgement_version\``);
    await runner.query(`DROP TABLE \`judgement_version\``);
    await runner.query(`DROP INDEX \`IDX_e525db97f45f9ffcbfda8375fe\` ON \`judgement_value\``);
    await runner.query(`DROP TABLE \`judgement_value\``);
    await runner.query(`DROP TABLE \`judgement_draft\``);
    await runner.query(`DROP INDEX \`IDX_d79602e223fe4417ff8a71e54f\` ON \`team_member\``);
    await runner.query(`DROP INDEX \`IDX_da6e300ef08afbd93fa4b42701\` ON \`team_member\``);
    await runner.query(`DROP TABLE \`team_member\``);
    await runner.query(`DROP INDEX \`IDX_992e894a9029ed30bfecd12ab8\` ON \`case_file\``);
    await runner.query(`DROP INDEX \`IDX_08d712d46bad09516a638842d5\` ON \`case_file\``);
    await runner.query(`DROP TABLE \`case_file\``);
    await runner.query(`DROP TABLE \`case_counter\``);
  }
}
