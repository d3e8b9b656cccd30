/** What is fetched with the first visit of Drift: the mission with its worker. */
import { createMissionWork } from '../work/missionWork';
import { createMission, type Mission, type MissionParts } from './mission';

export const startMission = (parts: Omit<MissionParts, 'work'>): Mission =>
  createMission({ ...parts, work: createMissionWork() });
