using System.Collections.Immutable;

namespace MemberScan.Screening.Sheets;

/// <summary>A lattice of squares laid over a section; only its nodes in and beside the material carry samples.</summary>
/// <param name="Columns">Nodes along y.</param>
/// <param name="Rows">Nodes along z.</param>
/// <param name="Left">y of the first column from the centroid [m].</param>
/// <param name="Bottom">z of the first row from the centroid [m].</param>
/// <param name="Cell">Side of a square [m].</param>
/// <param name="Numbers">Rows × columns, row-major from the bottom: the number of the sample at a node; −1 where there is none.</param>
public sealed record SampleGrid(int Columns, int Rows, double Left, double Bottom, double Cell, ImmutableArray<int> Numbers);
