import { Router } from 'express';
import { templateQuerySchema } from '../../shared/surveys/schemas';
import type { Services } from '../composition';
import { authorize } from '../middleware/authorize';
import { sendWorkbook } from '../middleware/sendWorkbook';
import { check } from '../middleware/validate';
import {
  blankTemplate,
  longTableExample,
  sectionSheetsExample,
} from '../workbooks/surveyTemplates';

const TEMPLATES = {
  'survey.xlsx': blankTemplate,
  'survey-example.xlsx': longTableExample,
  'survey-sections-example.xlsx': sectionSheetsExample,
};

/** Workbooks to begin with. */
export function templateRoutes({ authenticate }: Services): Router {
  const router = Router();
  for (const [name, build] of Object.entries(TEMPLATES)) {
    router.get(`/templates/${name}`, authenticate, authorize('template.read'), async (req, res) => {
      const { units } = await check(templateQuerySchema, req.query);
      sendWorkbook(res, name, build(units));
    });
  }
  return router;
}
