namespace MemberScan.Inputs.ForcesTables;

/// <summary>Takes the rows of a table while it is being read.</summary>
/// <param name="row">The row, valid for the call.</param>
public delegate void ForcesRowSink(in ForcesRow row);
