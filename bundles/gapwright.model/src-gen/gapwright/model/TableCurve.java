/**
 */
package gapwright.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Table Curve</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Monotone cubic through points, mirrored in the origin; slope µ0 beyond the last.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.TableCurve#getPoints <em>Points</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getTableCurve()
 * @model
 * @generated
 */
public interface TableCurve extends Curve {
	/**
	 * Returns the value of the '<em><b>Points</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.CurvePoint}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Rising in both values; the origin may be left out.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Points</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getTableCurve_Points()
	 * @model containment="true"
	 * @generated
	 */
	EList<CurvePoint> getPoints();

} // TableCurve
