// A slotted lug plate of a mooring, in millimetres: rounded corners, a slot, two bolt holes
$fn = 48;
difference() {
  hull() for (x = [12, 108], y = [10, 50]) translate([x, y]) circle(r = 10);
  hull() for (x = [45, 75]) translate([x, 30]) circle(r = 6);
  for (x = [16, 104]) translate([x, 30]) circle(r = 4.5);
}
