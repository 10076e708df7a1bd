import exceljs from 'exceljs';
import type { NumberStyle } from '#shared/house-style';
import { drawElement, type Drawing } from '../../drawing';
import type { ExportRequest } from '../../export-request';
import { printableLine } from '../../printable-text';
import { createCellStyles } from './cell-styles';
import { dictionarySheet } from './dictionary-sheet';
import { figureSheet } from './figure-sheet';
import { notesSheet } from './notes-sheet';
import type { SheetPlan } from './sheet-plan';
import { steadyWorkbook } from './steady-workbook';
import { tableSheet } from './table-sheet';
import { valuesSheet } from './values-sheet';
import { writeSheet } from './write-sheet';

/** Makes a workbook of a composed report: its tables and figures, then what stands behind them. */
export async function renderXlsx(request: ExportRequest): Promise<Uint8Array> {
  const { houseStyle, report } = request;
  const workbook = new exceljs.Workbook();
  describe(workbook, request);
  const drawing = workbookDrawing(houseStyle.numbers);
  const plans = [
    ...report.elements.flatMap((element) => drawElement(element, drawing)),
    valuesSheet(request.pins, request.phrasebook),
    dictionarySheet(request.codeBooks),
    notesSheet(request),
  ];
  const setting = { houseStyle, styles: createCellStyles(houseStyle) };
  for (const plan of plans) writeSheet(workbook, plan, setting);
  // Packed only once, by `steadyWorkbook`.
  const loose = await workbook.xlsx.writeBuffer({ zip: { compression: 'STORE' } });
  return steadyWorkbook(new Uint8Array(loose));
}

/** Words of the report stay in the document; what could not be printed is listed in the notes. */
function workbookDrawing(style: NumberStyle): Drawing<readonly SheetPlan[]> {
  const nothing = (): readonly SheetPlan[] => [];
  return {
    heading: nothing,
    paragraph: nothing,
    list: nothing,
    table: (element) => [tableSheet(element, style)],
    figure: (element) => [figureSheet(element, style)],
    problem: nothing,
  };
}

function describe(workbook: exceljs.Workbook, { report, study, changedAt }: ExportRequest): void {
  const moment = new Date(changedAt);
  workbook.title = printableLine(report.title);
  workbook.subject = printableLine(study.title);
  workbook.creator = 'Evenhand';
  workbook.lastModifiedBy = 'Evenhand';
  workbook.created = moment;
  workbook.modified = moment;
}
