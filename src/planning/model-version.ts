/**
 * The version of everything that decides a number of an answer.
 *
 * It changes whenever any number of any answer changes for the same question: the first part when the change is larger than
 * the printed rounding on an ordinary question or a rule is read differently, the second when new questions can be answered,
 * the third when numbers move by less than the rounding. Two answers with the same model version and the same digests agree
 * byte for byte.
 */
export const modelVersion = '1.0.0';
