import PDFDocument from 'pdfkit';
import type { ChartReport } from '~/domain/report/chart-report';
import { collect } from './collect';
import { drawBox } from './draw-box';
import { drawFurtherHead, drawHead } from './draw-head';
import { drawNotes, notesHeight } from './draw-notes';
import { blockGap, columnHeadHeight, drawRows, planColumns } from './draw-rows';
import { drawSketch } from './draw-sketch';
import { drawStick } from './draw-stick';
import { drawTitleBlock, titleBlockHeight } from './draw-title-block';
import { registerFaces } from './fonts';
import { paginate, rowHeight, type Room } from './paginate';
import { Pen } from './pen';
import { sheetOf, type Sheet } from './sheet';

const stickWidth = 138;
const stickGap = 14;

/**
 * Draws a chart as a PDF: one page where the rows allow, further pages with the rows over the full
 * width. Source Sans 3 is embedded; text is tagged and in reading order. The same report gives the
 * same bytes: the creation date is the day of issue.
 */
export async function drawChart(report: ChartReport): Promise<Buffer> {
  const sheet = sheetOf(report.paper);
  const document = new PDFDocument({
    autoFirstPage: false,
    margin: 0,
    size: [sheet.width, sheet.height],
    pdfVersion: '1.7',
    tagged: true,
    lang: 'en',
    displayTitle: true,
    info: {
      Title: report.title,
      Author: report.author,
      Subject: `Dip chart: ${report.liquid}`,
      Creator: 'Dipwright',
      Producer: 'Dipwright',
      CreationDate: new Date(report.issuedAt),
    },
  });
  const bytes = collect(document);
  registerFaces(document);
  const root = document.struct('Document');
  document.addStructure(root);
  const pen = new Pen(document, root);
  drawPages(pen, sheet, report);
  root.end();
  document.end();
  return bytes;
}

function drawPages(pen: Pen, sheet: Sheet, report: ChartReport): void {
  const foot = sheet.bottom - titleBlockHeight(pen, sheet, report, 99);
  pen.document.addPage();
  const boxTop = drawHead(pen, sheet, report);
  const bodyTop = drawBox(pen, sheet, report, boxTop) + 10;
  const notesTop = foot - notesHeight(pen, sheet, report) - 4;
  const first: Room = { height: notesTop - 10 - bodyTop - columnHeadHeight, blocks: 2 };
  const furtherTop = sheet.top + 48 + (report.superseded === null ? 0 : 32);
  const further: Room = { height: foot - 14 - furtherTop - columnHeadHeight, blocks: 3 };
  const pages = paginate(report.rows.length, report.rowGroup, first, further);
  drawStickColumn(pen, sheet, report, bodyTop, notesTop - 10);
  let done = 0;
  pages.forEach((blocks, index) => {
    let room = first;
    let top = bodyTop;
    let left = sheet.left + stickWidth + stickGap;
    if (index > 0) {
      pen.document.addPage();
      top = drawFurtherHead(pen, sheet, report) + 6;
      room = { ...further, height: foot - 14 - top - columnHeadHeight };
      left = sheet.left;
    }
    const across = Math.max(2, blocks.length);
    const width = (sheet.right - left - blockGap * (across - 1)) / across;
    const each = rowHeight(blocks, room);
    const plan = planColumns(pen, report, width, each);
    pen.within('Table', () => {
      blocks.forEach((count, block) => {
        const rows = report.rows.slice(done, done + count);
        done += count;
        drawRows(pen, report, rows, plan, {
          x: left + block * (width + blockGap),
          top,
          width,
          rowHeight: each,
        });
      });
    });
    if (index === 0) drawNotes(pen, sheet, report, notesTop);
    drawTitleBlock(pen, sheet, report, index + 1, pages.length);
  });
}

/** The left column of the first page: the stick, and under it the sketch. */
function drawStickColumn(
  pen: Pen,
  sheet: Sheet,
  report: ChartReport,
  top: number,
  bottom: number,
): void {
  const { sketch } = report;
  const stickTop = top + columnHeadHeight;
  if (sketch === null) {
    drawStick(pen, report, sheet.left, stickTop, stickWidth, bottom - stickTop - 6);
    return;
  }
  const wanted = ((stickWidth - 20) * sketch.heightMm) / sketch.widthMm + 46;
  const sketchHeight = Math.min(Math.max(wanted, 70), (bottom - stickTop) * 0.36);
  drawStick(pen, report, sheet.left, stickTop, stickWidth, bottom - stickTop - sketchHeight - 20);
  drawSketch(pen, sketch, {
    x: sheet.left,
    top: bottom - sketchHeight,
    width: stickWidth,
    height: sketchHeight,
  });
}
