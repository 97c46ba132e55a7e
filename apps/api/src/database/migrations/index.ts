import type { MigrationInterface } from 'typeorm';
import { Accounts1796140800000 } from './1796140800000-accounts';
import { SetsAndCast1796141100000 } from './1796141100000-sets-and-cast';
import { CushionOrders1796142000000 } from './1796142000000-cushion-orders';
import { UpholstererOfMessages1796144400000 } from './1796144400000-upholsterer-of-messages';
import { ConfidenceOfAWorkshop1796157600000 } from './1796157600000-confidence-of-a-workshop';
import { ErasedNames1796158800000 } from './1796158800000-erased-names';
import { PopulationsAndStudies1796161490650 } from './1796161490650-populations-and-studies';
import { AgeOfCastMembers1796165200000 } from './1796165200000-age-of-cast-members';
import { DimensionSearches1796170200000 } from './1796170200000-dimension-searches';
import { LifeOfAnOrder1796201340000 } from './1796201340000-life-of-an-order';
import { CushionSettings1796202960000 } from './1796202960000-cushion-settings';
import { ClothsOfAnOrder1796206800000 } from './1796206800000-cloths-of-an-order';
import { Arrangements1796238000000 } from './1796238000000-arrangements';
import { TestSits1796240400000 } from './1796240400000-test-sits';
import { BuildOfATestedFoam1796254800000 } from './1796254800000-build-of-a-tested-foam';

/** In the order in which they run. What is merged is never changed. */
export const MIGRATIONS: (new () => MigrationInterface)[] = [
  Accounts1796140800000,
  SetsAndCast1796141100000,
  CushionOrders1796142000000,
  UpholstererOfMessages1796144400000,
  ConfidenceOfAWorkshop1796157600000,
  ErasedNames1796158800000,
  PopulationsAndStudies1796161490650,
  AgeOfCastMembers1796165200000,
  DimensionSearches1796170200000,
  LifeOfAnOrder1796201340000,
  CushionSettings1796202960000,
  ClothsOfAnOrder1796206800000,
  Arrangements1796238000000,
  TestSits1796240400000,
  BuildOfATestedFoam1796254800000,
];
