using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace ClubBench.Club.Migrations.Sqlite
{
    /// <inheritdoc />
    public partial class StockMeasured : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<string>(
                name: "MeasuredJson",
                table: "stock_lots",
                type: "TEXT",
                nullable: true);
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropColumn(
                name: "MeasuredJson",
                table: "stock_lots");
        }
    }
}
