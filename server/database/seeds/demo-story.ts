import type { UserActor } from '../actor';
import { acceptApplication } from '../../services/review/accept-application';
import { declineApplication } from '../../services/review/decline-application';
import { decideCountersign } from '../../services/review/decide-countersign';
import { disposeFinding } from '../../services/review/dispose-finding';
import { amendApplication } from '../../services/drafts/amend-application';
import { saveDraftLine } from '../../services/drafts/save-draft-line';
import { withdrawApplication } from '../../services/drafts/withdraw-application';
import { listCountersigns } from '../../services/reads/list-countersigns';
import type { CreateApplicationRequest } from '../../../shared/contracts/api.generated';
import { DemoCase } from './demo-case';
import { LINES } from './demo-lines-of-cases';
import type { Cast } from './demo-people';
import type { Stage } from './demo-stage';

type Kind = CreateApplicationRequest['connectionKind'];

const about = (
  title: string,
  connectionKind: Kind,
  capacityMw: number | null,
  pointOfConnection: string,
) => ({
  title,
  connectionKind,
  capacityMw,
  pointOfConnection,
});

/** What happened to Fellgate Renewables’ applications in the weeks before today. */
export async function playFellgate(stage: Stage, cast: Cast): Promise<void> {
  const applicant = cast('sandgate', 'Fellgate Renewables');
  const thornholt = cast('thornholt');
  const wind = await DemoCase.open(
    stage,
    stage.ago(44),
    applicant,
    about('Fellgate Wind', 'generation', 480, 'Sarn'),
    LINES.fellgateWind(),
  );
  await wind.file(stage.ago(42, '11:20'));
  await wind.take(stage.ago(40), thornholt);
  await wind.raise(stage.ago(38), thornholt, {
    line: 'L4',
    code: 'geometry.b1',
    title: 'B1 of Harrow Fell – Fellgate',
    question:
      'B1 and B0 are half of what the geometry gives. Please check whether one leg of the pi was taken.',
    wanted: 'the whole charging of L4 in revision B',
  });
  await wind.raise(stage.ago(38, '10:30'), thornholt, {
    line: 'L1',
    code: 'geometry.x1',
    title: 'X1 of Fellgate – Sarn',
    question: 'X1 is far above what the geometry gives. Please check whether the value is per mile.',
    wanted: 'the unit of the X1 column from the maker of the table',
  });
  await wind.return(stage.ago(36), thornholt);
  await wind.change(stage.ago(30), 'L4', { slip: 'honest' });
  await wind.answer(stage.ago(30), 1, 'change', 'One leg of the pi it was. L4 now has the whole charging.');
  await wind.answer(
    stage.ago(29),
    2,
    'explanation',
    'Our table heads the column Ω/km, so we keep the value in revision B.',
  );
  await wind.file(stage.ago(17), 'L4 is put right.');
  await wind.settle(stage.ago(15), thornholt, 1, 'The charging of L4 agrees with its geometry now.');

  const storage = await DemoCase.open(
    stage,
    stage.ago(3),
    applicant,
    about('Fellgate Storage', 'storage', 200, 'Skell Edge'),
    LINES.fellgateStorage(),
  );
  await storage.file(stage.ago(1, '15:40'));

  const solar = await DemoCase.open(
    stage,
    stage.ago(2),
    applicant,
    about('Harrowfell Solar', 'generation', 180, 'Harrow Fell'),
    LINES.harrowfellSolar(),
  );
  const started = {
    name: 'Harrow Fell – Aldbeck',
    from: 'Harrow Fell',
    nominalVoltageKv: 230,
    frequencyHz: 60,
  };
  await solar.play(stage.ago(1), applicant, async (caller) => {
    await saveDraftLine(caller, solar.id, 'L2', { version: 0, line: started });
  });
}

/** What happened to Skerrow Power's. */
export async function playSkerrow(stage: Stage, cast: Cast): Promise<void> {
  const holm = cast('holm', 'Skerrow Power');
  await playSkerrowWind(stage, holm, cast('varley'));
  await playTarnMoss(stage, cast('aske', 'Skerrow Power'), cast('larkspur'));
  await playSkellEdge(stage, holm, cast('thornholt'));
  const tidal = await DemoCase.open(
    stage,
    stage.ago(20),
    holm,
    about('Pellow Tidal', 'generation', 45, 'Pellow Head'),
    LINES.pellowTidal(),
  );
  await tidal.file(stage.ago(18));
  await tidal.play(stage.ago(16), holm, (caller) =>
    withdrawApplication(caller, tidal.id, { reason: 'The project waits for another site.' }),
  );
  const wexmoor = await DemoCase.open(
    stage,
    stage.ago(27),
    holm,
    about('Wexmoor Solar', 'generation', 150, 'Tarn Moss'),
    LINES.wexmoorSolar(),
  );
  await wexmoor.file(stage.ago(25));
  await wexmoor.take(stage.ago(22), cast('larkspur'));
  await wexmoor.raise(stage.ago(4), cast('larkspur'), {
    line: 'L1',
    code: 'geometry.x1',
    title: 'X1 and B1 of Wexmoor – Tarn Moss',
    question: 'Both fit the geometry at 50 Hz, and this grid runs at 60 Hz.',
    wanted: 'all six values at 60 Hz',
  });
}

async function playSkerrowWind(stage: Stage, applicant: UserActor, varley: UserActor): Promise<void> {
  const wind = await DemoCase.open(
    stage,
    stage.ago(15),
    applicant,
    about('Skerrow Wind', 'generation', 620, 'Lang Knott'),
    LINES.skerrowWind(),
  );
  await wind.file(stage.ago(14));
  await wind.take(stage.ago(12), varley);
  await wind.raise(stage.ago(9), varley, {
    line: 'L2',
    code: 'geometry.x1',
    title: 'X1 of Lang Knott – Sarn',
    question: 'X1 and B1 look like those of one conductor, and the geometry has two a phase.',
    wanted: 'the values of the bundle',
  });
}

async function playTarnMoss(stage: Stage, applicant: UserActor, larkspur: UserActor): Promise<void> {
  const moss = await DemoCase.open(
    stage,
    stage.ago(18),
    applicant,
    about('Tarn Moss Wind', 'generation', 540, 'Tarn Moss'),
    LINES.tarnMossWind(),
  );
  await moss.file(stage.ago(16));
  await moss.take(stage.ago(13), larkspur);
  await moss.raise(stage.ago(9), larkspur, {
    line: 'L2',
    code: 'geometry.x1',
    title: 'X1 of Tarn Moss – Sarn',
    question: 'X1 and B1 look like those of one conductor, and the geometry has three a phase.',
    wanted: 'the values of the bundle of three',
  });
  await moss.raise(stage.ago(9, '10:20'), larkspur, {
    line: 'L5',
    code: 'geometry.x1',
    title: 'X1 of Tarn Moss – Ullscar Foot',
    question: 'The values fit the geometry at 50 Hz. At which frequency were they computed?',
  });
  await moss.return(stage.ago(7), larkspur);
  await moss.change(stage.ago(4), 'L2', { slip: 'honest' });
  await moss.answer(stage.ago(4), 1, 'change', 'The bundle was left out of the sheet. L2 has it now.');
}

async function playSkellEdge(stage: Stage, applicant: UserActor, thornholt: UserActor): Promise<void> {
  const supply = await DemoCase.open(
    stage,
    stage.ago(60),
    applicant,
    about('Skell Edge supply point', 'load', 85, 'Skell Edge'),
    LINES.skellEdgeSupply(),
  );
  await supply.file(stage.ago(58));
  await supply.take(stage.ago(55), thornholt);
  await supply.raise(stage.ago(53), thornholt, {
    line: 'L1',
    code: 'geometry.b1',
    title: 'B1 of Skell Edge – Cairnside',
    question: 'B1 is half of what the geometry gives.',
    wanted: 'the whole charging',
  });
  await supply.return(stage.ago(52), thornholt);
  await supply.change(stage.ago(47), 'L1', { slip: 'honest' });
  await supply.answer(stage.ago(47), 1, 'change', 'Put right: it was half of the pi.');
  await supply.file(stage.ago(46));
  await supply.settle(stage.ago(44), thornholt, 1, 'Agrees now.');
  await supply.play(stage.ago(43), thornholt, (caller) =>
    acceptApplication(caller, supply.id, {
      revision: 'B',
      conditions: ['As-built data of all three lines before energising.'],
    }),
  );
}

/** What happened to Lintgarth Industries’. */
export async function playLintgarth(stage: Stage, cast: Cast): Promise<void> {
  const garth = cast('garth', 'Lintgarth Industries');
  const hydrogen = await DemoCase.open(
    stage,
    stage.ago(4),
    garth,
    about('Lintgarth Hydrogen', 'load', 90, 'Harrow Fell'),
    LINES.lintgarthHydrogen(),
  );
  await hydrogen.file(stage.ago(3));
  await playAldbeck(stage, garth, cast('varley'), cast('larkspur'));
  await playDunmere(stage, cast('aske', 'Lintgarth Industries'), cast('thornholt'));
  await playCairnside(stage, garth, cast('varley'));
  const hydro = await DemoCase.open(
    stage,
    stage.ago(1),
    garth,
    about('Ullscar Hydro', 'generation', 36, 'Ullscar Foot'),
    LINES.ullscarHydro(),
  );
  await hydro.file(stage.ago(0, '08:05'));
}

async function playAldbeck(
  stage: Stage,
  applicant: UserActor,
  varley: UserActor,
  larkspur: UserActor,
): Promise<void> {
  const quarry = await DemoCase.open(
    stage,
    stage.ago(34),
    applicant,
    about('Aldbeck Quarry supply point', 'load', 30, 'Aldbeck'),
    LINES.aldbeckQuarry(),
  );
  await quarry.file(stage.ago(33));
  await quarry.take(stage.ago(31), varley);
  await quarry.play(stage.ago(28), varley, (caller) =>
    declineApplication(caller, quarry.id, {
      revision: 'A',
      reason:
        'L1 comes without its geometry and the applicant has told us that it will not be surveyed this year.',
    }),
  );
  await quarry.play(stage.ago(27), larkspur, async (caller) => {
    const { items } = await listCountersigns(caller, { outcome: 'pending' });
    const proposal = items.find((item) => item.applicationId === quarry.id);
    await decideCountersign(caller, proposal?.id ?? '', { outcome: 'granted', remark: 'Agreed.' });
  });
}

async function playDunmere(stage: Stage, applicant: UserActor, thornholt: UserActor): Promise<void> {
  const storage = await DemoCase.open(
    stage,
    stage.ago(30),
    applicant,
    about('Dunmere Storage', 'storage', 60, 'Dunmere'),
    LINES.dunmereStorage(),
  );
  await storage.file(stage.ago(29));
  await storage.take(stage.ago(26), thornholt);
  await storage.raise(stage.ago(25), thornholt, {
    line: 'L1',
    code: 'geometry.x1',
    title: 'X1 of Dunmere – Dunmere Storage',
    question: 'X1 fits the geometry if it is per mile. Is it?',
  });
  await storage.return(stage.ago(24), thornholt);
  await storage.answer(
    stage.ago(18),
    1,
    'explanation',
    'The value was measured in 1998 and has been used ever since.',
  );
  await storage.file(stage.ago(16));
  await storage.play(stage.ago(3), thornholt, async (caller) => {
    const fingerprint = await storage.finding(caller, 'L1', 'geometry.x1');
    const reason =
      'A measurement is announced for May; the study is made with the recomputed value until then.';
    await disposeFinding(caller, storage.id, fingerprint, 'waived', { revision: 'B', reason });
  });
}

async function playCairnside(stage: Stage, applicant: UserActor, varley: UserActor): Promise<void> {
  const rail = await DemoCase.open(
    stage,
    stage.ago(50),
    applicant,
    about('Cairnside Rail supply point', 'load', 40, 'Cairnside'),
    LINES.cairnsideRail(),
  );
  await rail.file(stage.ago(49));
  await rail.take(stage.ago(47), varley);
  await rail.play(stage.ago(45), varley, (caller) =>
    acceptApplication(caller, rail.id, { revision: 'A', reason: 'Declared values and geometry agree.' }),
  );
  await rail.play(stage.ago(2), applicant, (caller) =>
    amendApplication(caller, rail.id, { reason: 'The last span is moved to another tower.' }),
  );
}
