/** The worker of missions: histories and second looks, each kind in a worker of its own. */
import { answerCalls } from './calls';
import { createMissionCalls } from './missionCalls';
import { secondLook } from './secondLook';

const calls = { ...createMissionCalls(), secondLook };

export type MissionWorkerCalls = typeof calls;

answerCalls(calls);
