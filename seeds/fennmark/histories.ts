/** How far a report has come in the demonstration. */
export type End = 'draft' | 'in review' | 'returned' | 'approved' | 'issued' | 'corrected' | 'withdrawn' | 'remarked'

/** Example, name of the site, street, last day of the inspection, how far it has come. */
export type History = readonly [example: string, name: string, street: string, on: string, end: End]

/** Reports of Alder Electrical, in the order of their inspection. */
export const ALDER: readonly History[] = [
  ['heron-ford-dwelling', 'House at Sedge Bank', 'Sedge Bank 4', '2024-02-14', 'issued'],
  ['osier-lane-three-pole', 'Osier Lane Workshop', 'Osier Lane 7', '2024-04-09', 'issued'],
  ['tern-farm-tt', 'Plover Farm', 'Moor Road 31', '2024-06-20', 'corrected'],
  ['heron-ford-dwelling', 'House at Ferry Steps', 'Ferry Steps 2', '2024-09-03', 'issued'],
  ['smithy-past-the-device', 'Cooper’s Yard', 'Yard Lane 12', '2024-11-19', 'issued'],
  ['fell-side-dairy', 'High Fell Creamery', 'Fell Road 90', '2025-01-28', 'issued'],
  ['osier-lane-three-pole', 'Basket Works', 'Osier Lane 15', '2025-03-12', 'issued'],
  ['heron-ford-dwelling', 'House at Kiln Garth', 'Kiln Garth 8', '2025-04-24', 'withdrawn'],
  ['tern-farm-tt', 'Curlew Farm', 'Moor Road 58', '2025-06-05', 'issued'],
  ['heron-ford-dwelling', 'House at Bell Row', 'Bell Row 19', '2025-07-17', 'issued'],
  ['smithy-past-the-device', 'Old Forge', 'Forge Hill 3', '2025-09-30', 'issued'],
  ['osier-lane-three-pole', 'Print Shop at Weir Street', 'Weir Street 26', '2025-11-11', 'issued'],
  ['heron-ford-dwelling', 'House at Mill Brow', 'Mill Brow 5', '2026-01-22', 'issued'],
  ['tern-farm-tt', 'Lapwing Farm', 'Moor Road 77', '2026-03-18', 'corrected'],
  ['fell-side-dairy', 'Fell Side Dairy', 'Fell Road 41', '2026-04-22', 'issued'],
  ['smithy-past-the-device', 'Smithy at Ash Green', 'Ash Green 1', '2026-05-12', 'issued'],
  ['osier-lane-three-pole', 'Cycle Shop at Quay Road', 'Quay Road 6', '2026-07-08', 'approved'],
  ['heron-ford-dwelling', 'House at Heron Ford', 'Ford Path 11', '2026-09-03', 'in review'],
  ['tern-farm-tt', 'Tern Farm', 'Moor Road 12', '2026-09-18', 'remarked'],
  ['weir-mill-63', 'Weir Mill', 'Weir Street 1', '2026-09-29', 'returned'],
  ['alder-mill-bakery', 'Alder Mill Bakery', 'Mill Lane 4', '2026-10-13', 'returned'],
  ['fell-side-dairy', 'Goose Green Creamery', 'Goose Green 10', '2026-10-20', 'in review'],
  ['alder-mill-bakery', 'Bakery at Bridge End', 'Bridge End 2', '2026-10-28', 'draft'],
  ['reed-hall-design', 'Reed Hall', 'Reed Lane 2', '2026-11-03', 'draft'],
]

/** Reports of Tarn Side Installations. */
export const TARN: readonly History[] = [
  ['heron-ford-dwelling', 'House at Tarn Head', 'Tarn Head 3', '2024-03-05', 'issued'],
  ['smithy-past-the-device', 'Boat Shed', 'Tarn Side 14', '2024-07-16', 'issued'],
  ['osier-lane-three-pole', 'Sail Loft', 'Tarn Side 22', '2024-10-08', 'issued'],
  ['tern-farm-tt', 'Bittern Farm', 'Fen Road 9', '2025-02-11', 'issued'],
  ['heron-ford-dwelling', 'House at Rowan Gate', 'Rowan Gate 6', '2025-05-20', 'corrected'],
  ['fell-side-dairy', 'Fen Creamery', 'Fen Road 40', '2025-08-26', 'issued'],
  ['osier-lane-three-pole', 'Net Store', 'Tarn Side 30', '2025-12-02', 'withdrawn'],
  ['heron-ford-dwelling', 'House at Alder Close', 'Alder Close 17', '2026-02-17', 'issued'],
  ['smithy-past-the-device', 'Chandlery', 'Quay Road 33', '2026-06-09', 'issued'],
  ['tern-farm-tt', 'Dunlin Farm', 'Fen Road 63', '2026-08-18', 'in review'],
  ['osier-lane-three-pole', 'Rope Walk', 'Rope Walk 1', '2026-09-22', 'approved'],
  ['heron-ford-dwelling', 'House at Stone Cross', 'Stone Cross 12', '2026-10-15', 'returned'],
  ['reed-hall-design', 'Library at Reed Lane', 'Reed Lane 20', '2026-11-05', 'draft'],
]
