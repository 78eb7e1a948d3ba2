import { Router } from 'express';
import type { Services } from '../composition';
import { authorize } from '../middleware/authorize';
import { sendWorkbook } from '../middleware/sendWorkbook';
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
    router.get(`/templates/${name}`, authenticate, authorize('template.read'), (_req, res) => {
      sendWorkbook(res, name, build());
    });
  }
  return router;
}
