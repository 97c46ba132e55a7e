import { jsPDF } from 'jspdf';

const MARGIN_MM = 10;

/** Puts a picture on one page, as large as it goes, and hands it to the browser to keep. */
export async function keepPdf(canvas: HTMLCanvasElement, name: string): Promise<void> {
  const upright = canvas.height > canvas.width;
  const file = new jsPDF({
    orientation: upright ? 'portrait' : 'landscape',
    unit: 'mm',
    format: 'a4',
    compress: true,
  });
  const [across, up] = [file.internal.pageSize.getWidth(), file.internal.pageSize.getHeight()];
  const scale = Math.min((across - 2 * MARGIN_MM) / canvas.width, (up - 2 * MARGIN_MM) / canvas.height);
  file.setProperties({ title: name });
  file.addImage(canvas, 'PNG', MARGIN_MM, MARGIN_MM, canvas.width * scale, canvas.height * scale);
  await file.save(`${name}.pdf`, { returnPromise: true });
}
