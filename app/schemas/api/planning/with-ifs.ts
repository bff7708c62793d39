import { checkQuestionSchema } from "~/schemas/planning/check-answer";
import { whyQuerySchema } from "~/schemas/planning/why";

const { ifs } = checkQuestionSchema.shape;

/** The question of Check as its address holds it: `if` is repeated for each change to try. */
export const checkAddress = checkQuestionSchema.omit({ ifs: true }).extend({ if: ifs });
export const whyAddressQuery = whyQuerySchema.omit({ ifs: true }).extend({ if: ifs });
