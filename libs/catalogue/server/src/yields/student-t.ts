import { jStat } from 'jstat';
import type { StudentT } from '@seamwright/catalogue/domain';

/** The quantile of Student's t distribution, by jStat. */
export const studentT: StudentT = (probability, degreesOfFreedom) => jStat.studentt.inv(probability, degreesOfFreedom);
